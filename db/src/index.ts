export { migrations } from './migrations/all.js';
