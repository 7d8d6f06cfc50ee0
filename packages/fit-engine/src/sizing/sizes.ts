import { parseNumber } from '../units/parse-number.js';
import { mmPerIn } from '../units/factors.js';

export interface Size {
  key: string;
  eyeToEyeMm: number;
  strokeMm: number;
  family: 'eyelet' | 'trunnion' | 'inch';
  /** Other labels for the same size. */
  aliases: readonly string[];
}

const metric = (family: 'eyelet' | 'trunnion', eyeToEye: number, strokes: readonly number[]): Size[] =>
  strokes.map((stroke) => ({
    key: `${eyeToEye}x${stroke}`,
    eyeToEyeMm: eyeToEye,
    strokeMm: stroke,
    family,
    aliases: [],
  }));

const inch = (key: string, eyeToEyeIn: number, strokeIn: number, aliases: readonly string[] = []): Size => ({
  key,
  eyeToEyeMm: eyeToEyeIn * mmPerIn,
  strokeMm: strokeIn * mmPerIn,
  family: 'inch',
  aliases: [...aliases, `${eyeToEyeIn}x${strokeIn}`],
});

/** All nominal sizes (common practice). A size is its key; readings are compared with the true dimensions. */
export const sizes: readonly Size[] = [
  ...metric('eyelet', 190, [37.5, 40, 42.5, 45]),
  ...metric('eyelet', 210, [47.5, 50, 52.5, 55]),
  ...metric('eyelet', 230, [57.5, 60, 62.5, 65]),
  ...metric('eyelet', 250, [67.5, 70, 72.5, 75]),
  ...metric('trunnion', 165, [37.5, 40, 42.5, 45]),
  ...metric('trunnion', 185, [47.5, 50, 52.5, 55]),
  ...metric('trunnion', 205, [57.5, 60, 62.5, 65]),
  ...metric('trunnion', 225, [67.5, 70, 72.5, 75]),
  inch('165x38', 6.5, 1.5),
  inch('184x44', 7.25, 1.75),
  inch('190x50', 7.5, 2, ['190x51']),
  inch('197x48', 7.75, 1.9),
  inch('200x50', 7.875, 2, ['200x51']),
  inch('200x57', 7.875, 2.25),
  inch('216x63', 8.5, 2.5),
  inch('222x66', 8.75, 2.6),
  inch('222x70', 8.75, 2.75),
  inch('240x76', 9.5, 3, ['241x76']),
  inch('267x89', 10.5, 3.5),
];

const byKey = new Map(
  sizes.flatMap((size) => [size.key, ...size.aliases].map((name) => [name, size] as const)),
);

/** The size behind a key or label, or null. */
export const sizeOf = (key: string): Size | null => byKey.get(key) ?? null;

/**
 * The key that a text names: "210x55", "210 × 55 mm", "7.875 x 2.25", `7 7/8" x 2 1/4"`, "55 x 210" (a swapped pair is
 * recognised, since the first number is always the greater). Null when it names no size: there is no "close enough".
 */
export function findSizeKey(text: string): string | null {
  const parts = text
    .toLowerCase()
    .replace(/["”″]|(?<![a-z])(mm|inch(es)?|in)(?![a-wyz])/g, ' ')
    .split(/[x×*]/);
  if (parts.length !== 2) return null;
  const numbers = parts.map((part) => parseNumber(part.trim().replace(/\s+/g, ' ')));
  const [a, b] = numbers;
  if (a === null || b === null || a === undefined || b === undefined) return null;
  return sizeOf(`${Math.max(a, b)}x${Math.min(a, b)}`)?.key ?? null;
}
