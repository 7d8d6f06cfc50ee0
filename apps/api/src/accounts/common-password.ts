/**
 * Words and walks that most guessed passwords are built from. Written down from memory, not taken from a list;
 * a breach corpus belongs to the accounts work.
 */
const cores = `password passwort motdepasse passphrase letmein welcome admin administrator login signin secret
qwerty qwertyuiop qwertz azerty asdfgh asdfghjkl zxcvbn zxcvbnm qazwsx qazwsxedc iloveyou sunshine princess dragon
monkey football baseball superman batman trustno master shadow michael jennifer jordan hunter charlie ashley
liverpool arsenal chelsea rangers computer internet samsung google facebook whatever freedom starwars pokemon
cheese summer winter spring autumn monday friday january december mountain mountainbike bicycle cycling linkfell
changeme default guest test testing temporary correcthorsebatterystaple thequickbrownfox maytheforcebewithyou
ihateyou mypassword newpassword mysecret letmeinplease opensesame abcdef abcdefgh abcdefghijklmnop
abcdefghijklmnopqrstuvwxyz`
  .trim()
  .split(/\s+/);

const rows = [
  '01234567890',
  '09876543210',
  'abcdefghijklmnopqrstuvwxyz',
  'qwertyuiop',
  'asdfghjkl',
  'zxcvbnm',
];
const leet: Record<string, string> = {
  '0': 'o',
  '1': 'i',
  '3': 'e',
  '4': 'a',
  '5': 's',
  '7': 't',
  '@': 'a',
  $: 's',
  '!': 'i',
};

const lettersOf = (text: string): string =>
  [...text]
    .map((sign) => leet[sign] ?? sign)
    .join('')
    .replace(/[^\p{L}]/gu, '');

/** Shortest piece of which the text is a repetition; the text itself if it is none. */
function unit(text: string): string {
  return /^(.+?)\1*$/su.exec(text)?.[1] ?? text;
}

/** What is left when every known word is taken out, longest first. */
function withoutWords(text: string, words: readonly string[]): string {
  return [...words]
    .sort((a, b) => b.length - a.length)
    .reduce((rest, word) => rest.split(word).join(''), text);
}

/**
 * Whether a password would be among the first to be guessed: one piece repeated, a walk over the keys, or common
 * words (or the account's own name and address) with a few digits and signs around them.
 * @param own words that belong to the account, such as its e-mail address
 */
export function isCommonPassword(password: string, own: readonly string[] = []): boolean {
  const lower = password.normalize('NFKC').toLowerCase();
  if (unit(lower).length <= 4) return true;
  if (rows.some((row) => withoutWords(lower, pieces(row)).length <= 3)) return true;
  const ownWords = own
    .flatMap((word) => word.toLowerCase().split(/[^\p{L}]+/u))
    .filter((word) => word.length >= 4);
  const words = [...cores, ...ownWords];
  const plain = lower.replace(/[^\p{L}]/gu, '');
  return [plain, lettersOf(lower)].some((letters) => withoutWords(letters, words).length <= 3);
}

/** The row forwards and backwards, whole and in runs of five. */
function pieces(row: string): string[] {
  return [row, [...row].reverse().join('')].flatMap((line) => [
    line,
    ...Array.from({ length: Math.max(0, line.length - 4) }, (_, start) => line.slice(start, start + 5)),
  ]);
}
