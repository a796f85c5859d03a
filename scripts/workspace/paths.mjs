import path from 'node:path';
import { fileURLToPath } from 'node:url';

export const root = fileURLToPath(new URL('../../', import.meta.url)).replace(/[\\/]$/, '');

export function inRoot(...parts) {
  return path.join(root, ...parts);
}
