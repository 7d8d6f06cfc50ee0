import { sentences } from './sentences.en.js';

/** Every code the engine can give; the catalogue of sentences is the list. */
export type ReasonCode = keyof typeof sentences;
export const reasonCodes = Object.keys(sentences) as ReasonCode[];
