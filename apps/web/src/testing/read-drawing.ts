export interface DrawnDimension {
  key: string;
  mm: number;
  /** Length of the line as drawn, in the SVG's own units. */
  length: number;
  text: string;
  asked: boolean;
}

const figure = (element: Element, name: string): number => Number(element.getAttribute(name));

/** Reads the dimension lines out of a drawing, as somebody with a ruler would. */
export function readDimensions(svg: Element): DrawnDimension[] {
  return [...svg.querySelectorAll('[data-dim]')].map((group) => {
    const line = group.querySelector('[data-line]');
    if (!line) throw new Error('A dimension without its line');
    return {
      key: group.getAttribute('data-dim') ?? '',
      mm: figure(group, 'data-mm'),
      length: Math.hypot(figure(line, 'x2') - figure(line, 'x1'), figure(line, 'y2') - figure(line, 'y1')),
      text: group.querySelector('text')?.textContent ?? '',
      asked: group.hasAttribute('data-asked'),
    };
  });
}

/** The x of the middle of a part, mm: of the two eyes, whose distance is the shock's length. */
export function middleOf(svg: Element, part: string): number {
  const d = svg.querySelector(`[data-part="${part}"]`)?.getAttribute('d') ?? '';
  // A circle begins at its left and goes two radii to the right.
  const [, left, width] = /^M(-?[\d.]+) .*?0 1 0 (-?[\d.]+) /.exec(d) ?? [];
  return Number(left) + Number(width) / 2;
}

/** All that is seen, as one text to compare. */
export const pictureOf = (svg: Element): string =>
  [...svg.querySelectorAll('path')]
    .map((path) => `${path.getAttribute('d')} ${path.getAttribute('stroke-dasharray')}`)
    .join('\n');
