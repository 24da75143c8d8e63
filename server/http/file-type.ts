/** `file-type` ships ES modules only and is loaded when first needed. */
export async function fromFile(path: string): Promise<{ mime: string } | undefined> {
  const { fileTypeFromFile } = await import('file-type');
  return fileTypeFromFile(path);
}
