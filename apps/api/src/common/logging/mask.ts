const emailAddress = /([A-Za-z0-9._%+-])[A-Za-z0-9._%+-]*@([A-Za-z0-9-]+(?:\.[A-Za-z0-9-]+)+)/g;
/** Tokens of ours are 22 characters of base64url or more, after a `#` or `token=`. */
const token = /(#|token["']?[=:]\s*["']?)[A-Za-z0-9_-]{20,}/gi;

/** A log line with the e-mail addresses and tokens in it made unusable: `w…@example.test`. */
export function mask(line: string): string {
  return line.replace(emailAddress, '$1…@$2').replace(token, '$1…');
}
