import { existsSync } from 'node:fs';

const usual = ['/usr/bin/chromium', '/usr/bin/chromium-browser', '/usr/bin/google-chrome'];

/** The browser that the tests drive: CHROMIUM names it, or it is where Debian puts it. */
export function chromiumPath(env = process.env) {
  return [env.CHROMIUM, ...usual].find((file) => file && existsSync(file));
}

export const chromiumAbsent =
  'Chromium is not installed, so nothing was tested in a browser. On Debian: apt-get install chromium; ' +
  'or name one with CHROMIUM=/path/to/chromium.';
