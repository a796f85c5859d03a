import { mkdir, rm, writeFile } from 'node:fs/promises';
import path from 'node:path';
import type { BrowserContext, Page } from 'playwright-core';
import { axeFindings, selectorOf } from '../support/axe.ts';
import { browser, closeBrowser, phone, still, watch, wide } from '../support/browser.ts';
import { startHidewright } from '../support/hidewright.ts';
import { mailThat } from '../support/mailbox.ts';
import { settled, signInAs, type Role } from '../support/steps.ts';
import { screensOf, type Read, type Screen } from './routes.ts';

/**
 * `npm run screens`: draws every screen for each role, wide and on a phone, light and dark, with what axe finds.
 * `npm run screens -- maker phone light` draws some of them.
 */
const folder = path.resolve(import.meta.dirname, '..', '..', 'screens');
const asked = process.argv.slice(2);
const widths = { wide, phone };
const roles = chosen(['owner', 'maker', 'bookkeeper'] as const);
const widthNames = chosen(['wide', 'phone'] as const);
const schemes = chosen(['light', 'dark'] as const);

/** Those of a kind that were asked for; all of them where none was. */
function chosen<Name extends string>(names: readonly Name[]): readonly Name[] {
  const some = names.filter((name) => asked.includes(name));
  return some.length > 0 ? some : names;
}

interface Finding {
  screen: string;
  what: string;
}

const findings: Finding[] = [];
let drawn = 0;

async function draw(page: Page, screen: Screen, name: string, heard: string[]): Promise<void> {
  await page.goto(screen.path);
  await settled(page);
  await page.screenshot({ path: path.join(folder, `${name}.png`), fullPage: true });
  drawn += 1;
  for (const { id, nodes } of await axeFindings(page)) {
    findings.push({
      screen: name,
      what: `axe ${id}: ${nodes.slice(0, 1).map(selectorOf).join('')}`,
    });
  }
  const tooWide = await page.evaluate(
    () => document.documentElement.scrollWidth > window.innerWidth,
  );
  if (tooWide) findings.push({ screen: name, what: 'wider than the window' });
  for (const complaint of heard.splice(0)) findings.push({ screen: name, what: complaint });
}

async function context(
  baseURL: string,
  width: keyof typeof widths,
  colorScheme: 'light' | 'dark',
): Promise<BrowserContext> {
  return (await browser()).newContext({
    ...still,
    baseURL,
    viewport: widths[width],
    colorScheme,
    reducedMotion: 'reduce',
  });
}

function reader(page: Page, url: string): Read {
  return async (address) => {
    const separator = address.includes('?') ? '&' : '?';
    const reply = await page.request.get(`${url}/api${address}${separator}limit=200`);
    if (!reply.ok()) throw new Error(`${address} answered ${reply.status()}`);
    return (await reply.json()) as Awaited<ReturnType<Read>>;
  };
}

async function drawRole(url: string, role: Role): Promise<void> {
  for (const width of widthNames) {
    for (const scheme of schemes) {
      const opened = await context(url, width, scheme);
      const page = await opened.newPage();
      const heard = watch(page);
      await signInAs(page, url, role);
      for (const screen of await screensOf(role, reader(page, url))) {
        await draw(page, screen, `${role}-${screen.name}-${width}-${scheme}`, heard);
      }
      await opened.close();
    }
  }
}

/** The front door, and the customer's page by the link of the latest mail. */
async function drawOutside(url: string, mailboxUrl: string): Promise<void> {
  const mail = await mailThat(mailboxUrl, ({ links }) =>
    links.some((link) => link.includes('/c/')),
  );
  const offer = new URL(mail.links.find((link) => link.includes('/c/')) ?? url).pathname;
  for (const width of widthNames) {
    for (const scheme of schemes) {
      const opened = await context(url, width, scheme);
      const page = await opened.newPage();
      const heard = watch(page);
      await draw(
        page,
        { name: 'sign-in', path: '/sign-in' },
        `nobody-sign-in-${width}-${scheme}`,
        heard,
      );
      await draw(page, { name: 'offer', path: offer }, `customer-offer-${width}-${scheme}`, heard);
      await opened.close();
    }
  }
}

await rm(folder, { recursive: true, force: true });
await mkdir(folder, { recursive: true });
const hidewright = await startHidewright();
try {
  await drawOutside(hidewright.url, hidewright.mailboxUrl);
  // Side by side, since most of the time goes into waiting for a page to come to rest.
  await Promise.all(roles.map((role) => drawRole(hidewright.url, role)));
} finally {
  await closeBrowser();
  await hidewright.stop();
}
await writeFile(path.join(folder, 'findings.json'), `${JSON.stringify(findings, null, 2)}\n`);
for (const { screen, what } of findings) console.error(`${screen}: ${what}`);
console.log(
  `Drew ${drawn} screens into ${path.relative(process.cwd(), folder)}; ${findings.length} findings.`,
);
process.exitCode = findings.length === 0 ? 0 : 1;
