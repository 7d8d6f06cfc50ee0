/** Markup that may go into a page as it is. */
export class Html {
  constructor(readonly text: string) {}
}

const ESCAPES: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

function render(value: unknown): string {
  if (value instanceof Html) return value.text;
  if (Array.isArray(value)) return value.map(render).join('');
  if (value === null || value === undefined || value === false) return '';
  return String(value).replace(/[&<>"']/g, (character) => ESCAPES[character] ?? character);
}

/**
 * A template whose values are escaped, except markup made by this same tag. Not named `html`: the formatter would
 * change the white space inside, and with it the style's hash.
 */
export function markup(parts: TemplateStringsArray, ...values: unknown[]): Html {
  return new Html(parts.reduce((text, part, index) => text + render(values[index - 1]) + part));
}
