/** `file-type` ships ES modules only and is loaded when first needed. */
export async function fromFile(path: string): Promise<{ mime: string } | undefined> {
  const { fileTypeFromFile } = await import('file-type');
  return fileTypeFromFile(path);
}

/** The same by a file's first bytes. */
export async function fromBuffer(head: Uint8Array): Promise<{ mime: string } | undefined> {
  const { fileTypeFromBuffer } = await import('file-type');
  return fileTypeFromBuffer(head);
}
