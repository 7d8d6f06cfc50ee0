/** One whole sentence per change that would let a refused shock in; {sizes} is the list of sizes. */
export const insteadSentences = {
  'instead-listed-size': 'A shock of size {sizes}.',
  'instead-mounts': 'The same size with the mounts that the frame asks for.',
  'instead-air': 'An air shock of this size.',
  'instead-coil': 'A coil shock of this size.',
  'instead-inline': 'An inline shock of this size.',
  'instead-narrower': 'A shock with a narrower body.',
  'instead-other-pressure': 'An air shock with other pressure limits, or a coil where the maker allows it.',
  'instead-other-spring': 'An air shock of this size, or a spring that is not on sale here.',
  'instead-with-remote': 'A shock with a remote.',
  'instead-without-remote': 'A shock without a remote.',
  'instead-e-bike': 'A shock that its maker allows on e-bikes.',
  'instead-higher-limit': 'A shock with a higher weight limit.',
  'instead-other-way-round': 'A shock that may go in the other way round.',
  'instead-after-notice': 'Nothing until the maker’s notice has been dealt with.',
} as const;
export type InsteadCode = keyof typeof insteadSentences;
