export type ParsedNumber = { kind: 'empty' } | { kind: 'text' } | { kind: 'number'; value: number };

const PLAIN = /^[-+]?(\d+(\.\d*)?|\.\d+)$/;
const GROUPED = /^[-+]?\d{1,3}(,\d{3})+(\.\d*)?$/;

/**
 * Reads a figure as people write it in the United States and in Mexico:
 * a point before decimals, commas only between groups of three. Anything
 * else, `2,5` too, is text: a guess could be ten times the figure.
 */
export function parseNumber(typed: string): ParsedNumber {
  const text = typed.trim();
  if (text === '') return { kind: 'empty' };
  if (PLAIN.test(text)) return { kind: 'number', value: Number(text) };
  if (GROUPED.test(text)) return { kind: 'number', value: Number(text.replaceAll(',', '')) };
  return { kind: 'text' };
}
