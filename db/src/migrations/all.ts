import { CreateCore1764576000000 } from './1764576000000-CreateCore.js';

/** All migrations, oldest first. Add a new class at the end; never edit one that has landed. */
export const migrations = [CreateCore1764576000000];
