const inlineStyle = /<style data-emotion="css(-global)? ([^"]*)">([\s\S]*?)<\/style>/g;

/**
 * Takes the style elements that were rendered among the markup out of it, each rule once.
 * @returns the markup, and style elements for the head that the style library in the browser takes as its own
 */
export function collectStyles(html: string): { html: string; style: string } {
  const globals = new Map<string, string>();
  const locals = new Map<string, string>();
  const plain = html.replace(inlineStyle, (_all, global: string | undefined, name: string, css: string) => {
    (global ? globals : locals).set(name, css);
    return '';
  });
  const element = (names: string, css: string) => `<style data-emotion="${names}">${css}</style>`;
  return {
    html: plain,
    style: [
      ...[...globals].map(([name, css]) => element(`css-global ${name}`, css)),
      element(`css ${[...locals.keys()].join(' ')}`, [...locals.values()].join('')),
    ].join(''),
  };
}
