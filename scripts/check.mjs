import { runChecks } from './workspace/check-steps.mjs';
import { ensureInstalled } from './workspace/installed.mjs';

await ensureInstalled();
const { failed } = await runChecks(process.argv.slice(2));
process.exitCode = failed === 0 ? 0 : 1;
