export { migrateDatabase } from './migrate-database.js';
export { migrations } from './migrations/all.js';
export { readDemoPairs, type DemoPair } from './seed/demo-pairs.js';
export { loadDemo } from './seed/load-demo.js';
export { readScenario, type Scenario } from './seed/scenario.js';
