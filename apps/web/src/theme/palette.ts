/** One colour in both modes. Every pair of text and ground that we use is checked for contrast in palette.spec.ts. */
export interface ColourPair {
  light: string;
  dark: string;
}

const pair = (light: string, dark: string): ColourPair => ({ light, dark });

export const palette = {
  /** The page. */
  chalk: pair('#F7F5EF', '#142027'),
  /** Cards, sheets, inputs. */
  paper: pair('#FFFFFF', '#1C2B34'),
  /** Text and object lines. */
  ink: pair('#1B2A33', '#ECE9E0'),
  /** Secondary text and thin lines. */
  slate: pair('#4A5D68', '#A9B8C1'),
  /** Borders of inputs: 3 to 1 on the page and on cards alike. */
  rule: pair('#7A8993', '#667A86'),
  /** Hairlines between rows, never the border of a control. */
  hair: pair('#D9DCD6', '#31434E'),
  /** A quiet ground for what is hovered or set apart. */
  wash: pair('#EEECE4', '#22333D'),
  /** The rider's own shock behind a candidate. */
  shade: pair('#D5D9D6', '#3A4C57'),
  /** Primary actions, the dimension in question. */
  bracken: pair('#A4461B', '#F0905A'),
  brackenDeep: pair('#85360F', '#F6AB80'),
  brackenTint: pair('#F8E7DC', '#3B2B24'),
  /** Text on bracken. */
  onBracken: pair('#FFFFFF', '#142027'),
  /** Links, selection, information. */
  tarn: pair('#1C6470', '#7CC4CF'),
  tarnDeep: pair('#124853', '#A5DAE2'),
  tarnTint: pair('#E3EFF0', '#1A3840'),
  moss: pair('#3A6628', '#9CCB83'),
  mossTint: pair('#E5EFDD', '#233527'),
  gorse: pair('#7A5600', '#E8C35A'),
  gorseTint: pair('#FBF0CB', '#393220'),
  heather: pair('#63477F', '#C6ACE0'),
  heatherTint: pair('#ECE6F2', '#322E43'),
  brick: pair('#9C2A2A', '#F09A94'),
  brickTint: pair('#F8E1DF', '#3C2A2E'),
} as const satisfies Record<string, ColourPair>;

export type ColourName = keyof typeof palette;
