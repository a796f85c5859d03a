import { readConfig } from './src/config.ts';
import { makeDemo } from './src/seeders/demo/make-demo.ts';
const t = Date.now();
await makeDemo(readConfig({ ...process.env, MODE: 'demo', LOG_LEVEL: 'warn' }));
console.info('seeded in', Date.now() - t);
