/** The JSON Pointer of every key and member inside a value, parents before their children. */
export function pointersOf(value: unknown, base = ''): string[] {
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, child]) => {
    const pointer = `${base}/${key}`;
    return [pointer, ...pointersOf(child, pointer)];
  });
}
