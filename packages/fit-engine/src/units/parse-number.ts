const vulgar: Readonly<Record<string, string>> = {
  '¼': '1/4',
  '½': '1/2',
  '¾': '3/4',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8',
};

/**
 * A plain number with a dot or a decimal comma, a fraction ("7/8") or a mixed number ("7 7/8", "7-7/8", "7⅞").
 * Null for anything else: no sign, no exponent, no thousands separator, so that a slip is never read as a figure.
 */
export function parseNumber(text: string): number | null {
  const clean = text
    .trim()
    .replace(/[¼½¾⅛⅜⅝⅞]/, (found) => ` ${vulgar[found]}`)
    .trim()
    .replace(',', '.');
  const mixed = /^(?:(\d{1,9})(?:\s*-\s*|\s+))?(\d{1,9})\s*[/⁄]\s*(\d{1,9})$/.exec(clean);
  if (mixed) {
    const denominator = Number(mixed[3]);
    return denominator === 0 ? null : Number(mixed[1] ?? 0) + Number(mixed[2]) / denominator;
  }
  return /^\d{1,15}(\.\d{1,15})?$|^\.\d{1,15}$/.test(clean) ? Number(clean) : null;
}
