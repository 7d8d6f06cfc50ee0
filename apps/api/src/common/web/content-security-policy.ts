import { createHash } from 'node:crypto';

const sha256 = (text: string): string => `'sha256-${createHash('sha256').update(text).digest('base64')}'`;

/** The style library puts an empty <style> into the page and fills it through the DOM, which needs the empty hash. */
const emptyStyle = sha256('');

const inlineScript = /<script(?![^>]*\bsrc=)[^>]*>([\s\S]*?)<\/script>/gi;
const inlineStyle = /<style[^>]*>([\s\S]*?)<\/style>/gi;

const hashesOf = (html: string, pattern: RegExp): string[] => [
  ...new Set([...html.matchAll(pattern)].map((match) => sha256(match[1] ?? ''))),
];

/**
 * The policy of one of our own built pages: nothing inline runs or styles but what the build itself wrote into
 * this very file, known by its hash. Attribute styles stay allowed: drawings are positioned with them.
 */
export function pagePolicy(html: string): string {
  return [
    `default-src 'none'`,
    ["script-src 'self'", ...hashesOf(html, inlineScript)].join(' '),
    ["style-src 'self'", emptyStyle, ...hashesOf(html, inlineStyle)].join(' '),
    `style-src-attr 'unsafe-inline'`,
    `img-src 'self' data:`,
    `font-src 'self'`,
    `connect-src 'self'`,
    `manifest-src 'self'`,
    `form-action 'self'`,
    `frame-ancestors 'none'`,
    `object-src 'none'`,
    `base-uri 'none'`,
  ].join('; ');
}

/** Whatever is not a page of ours can load nothing at all. */
export const nothingPolicy = `default-src 'none'; frame-ancestors 'none'; base-uri 'none'; form-action 'none'`;
