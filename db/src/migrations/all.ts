import { CreateCore1764576000000 } from './1764576000000-CreateCore.js';
import { AddModelPapers1764603000000 } from './1764603000000-AddModelPapers.js';

/** All migrations, oldest first. Add a new class at the end; never edit one that has landed. */
export const migrations = [CreateCore1764576000000, AddModelPapers1764603000000];
