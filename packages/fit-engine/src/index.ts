export * from './facts.js';
export * from './answers.js';
