/** `steps[2].stretches[0].end`. */
export function pathText(path: readonly PropertyKey[]): string {
  return path.reduce<string>(
    (text, part) =>
      typeof part === 'number'
        ? `${text}[${part}]`
        : text === ''
          ? String(part)
          : `${text}.${String(part)}`,
    '',
  );
}
