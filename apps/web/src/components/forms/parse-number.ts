/**
 * Reads what a rider typed: "209,6", " 209.6 ", "1 204". One comma or dot is the decimal sign.
 * @returns the number, or null when it is empty or no plain number
 */
export function parseNumber(raw: string): number | null {
  const text = raw.trim().replace(/[\s\u00a0\u202f]/g, '');
  if (!/^[+-]?(\d+([.,]\d*)?|[.,]\d+)$/.test(text)) return null;
  return Number(text.replace(',', '.'));
}
