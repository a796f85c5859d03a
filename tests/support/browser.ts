import { existsSync } from 'node:fs';
import { chromium, type Browser, type Page } from 'playwright-core';

const usual = ['/usr/bin/chromium', '/usr/bin/chromium-browser', '/usr/bin/google-chrome'];

/** A sandbox cannot be made as root, and nothing but the page under test should reach the network. */
const flags = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

let running: Promise<Browser> | undefined;

/** Nothing fades in or out: halfway through, words have too little contrast to be read. */
export const still = { reducedMotion: 'reduce' } as const;

/** One browser for all tests of a file. */
export function browser(): Promise<Browser> {
  running ??= launch();
  return running;
}

export async function closeBrowser(): Promise<void> {
  await (await running)?.close();
  running = undefined;
}

/** A browser of its own whose camera sees a film; whoever asks for it closes it. */
export function browserWithCamera(film: string): Promise<Browser> {
  return launch([
    '--use-fake-device-for-media-stream',
    '--use-fake-ui-for-media-stream',
    `--use-file-for-fake-video-capture=${film}`,
  ]);
}

function launch(more: readonly string[] = []): Promise<Browser> {
  const executablePath = [process.env['CHROMIUM'], ...usual].find(
    (file) => file && existsSync(file),
  );
  if (executablePath === undefined) {
    throw new Error('Chromium is not installed. On Debian: apt-get install chromium');
  }
  return chromium.launch({ executablePath, args: [...flags, ...more], headless: true });
}

/** Whatever a page complains of: errors in its console, thrown ones, and breaches of its security policy. */
export function watch(page: Page): string[] {
  const complaints: string[] = [];
  page.on('console', (message) => {
    if (message.type() === 'error')
      complaints.push(`${message.text()} (${message.location().url})`);
  });
  page.on('pageerror', (error) => complaints.push(error.message));
  return complaints;
}

export const wide = { width: 1440, height: 900 };
export const phone = { width: 390, height: 844 };
