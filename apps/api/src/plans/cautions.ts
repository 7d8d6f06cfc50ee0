/** Shown wherever a rider is about to buy, have fitted or fit. */
export const cautions: readonly string[] = [
  'The makers’ manuals and your local rules come before anything here.',
  'Pressurised air, gas and springs under load can injure, and so can a part that fails while riding. If unsure, have a qualified mechanic do it.',
  'Every bolt is torqued to the figure printed on it, on the frame or in the manual.',
  'Our figures are starting points. Check for recalls, and stop riding if something knocks, leaks or comes loose.',
  'What the frame’s maker has not listed may void its warranty.',
];
