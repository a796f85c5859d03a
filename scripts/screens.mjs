import { ensureInstalled } from './workspace/installed.mjs';
import { inRoot } from './workspace/paths.mjs';
import { become } from './workspace/run.mjs';

await ensureInstalled();
become(process.execPath, ['--import', 'tsx', 'screens/screens.ts', ...process.argv.slice(2)], {
  cwd: inRoot('tests'),
});
