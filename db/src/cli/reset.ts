import { resetDemo } from '../seed/reset-demo.js';
import { databaseUrl } from './database-url.js';

await resetDemo(databaseUrl());
console.log('fresh demo data loaded');
