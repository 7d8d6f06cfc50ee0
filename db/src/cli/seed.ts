import { loadDemo } from '../seed/load-demo.js';
import { databaseUrl } from './database-url.js';

console.log((await loadDemo(databaseUrl())) ? 'demo data loaded' : 'demo data is there already');
