import { chromium } from 'playwright-core';
const url = 'http://127.0.0.1:4381';
const b = await chromium.launch({ executablePath: '/usr/bin/chromium', args: ['--no-sandbox'] });
const out = '/tmp/shots-services';
const only = process.argv.slice(2);
async function as(role: string, width: number, scheme: 'light' | 'dark', go: (p: any, shot: (n: string) => Promise<void>) => Promise<void>) {
  const c = await b.newContext({ viewport: { width, height: width > 500 ? 900 : 844 }, colorScheme: scheme, reducedMotion: 'reduce' });
  const p = await c.newPage();
  await p.goto(`${url}/sign-in`);
  await p.getByRole('button', { name: new RegExp(`, ${role}`) }).click();
  await p.waitForURL('**/today');
  const shot = async (n: string) => {
    await p.waitForLoadState('networkidle');
    await p.screenshot({ path: `${out}/${n}-${width}-${scheme}.png`, fullPage: true });
  };
  await go(p, shot);
  await c.close();
}
const api = async (p: any, a: string) => (await (await p.request.get(`${url}/api${a}`)).json());
for (const [width, scheme] of [[1440, 'light'], [390, 'dark']] as const) {
  await as('owner', width, scheme, async (p, shot) => {
    const orders = (await api(p, '/purchase-orders?limit=200')).items;
    const work = orders.find((o: any) => o.lines.some((l: any) => l.of === 'service'));
    const lotId = work.lines[0].service.lotId;
    const lots = (await api(p, '/lots?onRack=yes&limit=200')).items;
    const free = lots.find((l: any) => l.freeAreaMm2 === l.onHandAreaMm2);
    await p.goto(`${url}/stockroom/purchase-orders/new?lot=${free.id}`);
    await p.waitForLoadState('networkidle');
    const line = p.getByRole('group', { name: 'Line 1: work on a lot' });
    await line.getByLabel('Work', { exact: true }).selectOption('own');
    await line.getByLabel(/^Area/).fill('900');
    await p.getByRole('button', { name: 'Save the draft' }).click();
    await shot('draft');
    await p.goto(`${url}/stockroom/purchase-orders/${work.id}`); await p.waitForLoadState('networkidle'); await shot('order');
    await p.goto(`${url}/stockroom/lots/${lotId}`); await p.waitForLoadState('networkidle'); await shot('lot');
    await p.goto(`${url}/stockroom/lots`); await p.waitForLoadState('networkidle'); await shot('lots');
    await p.goto(`${url}/stockroom/receive?order=${work.id}`); await p.waitForLoadState('networkidle'); await shot('receive');
    await p.goto(`${url}/stockroom/leather`); await p.waitForLoadState('networkidle'); await shot('leather');
    if (width > 500) { const pdf = await p.request.get(`${url}/api/purchase-orders/${work.id}/paper`); (await import('node:fs')).writeFileSync(`${out}/order.pdf`, await pdf.body()); }
  });
}
await b.close();
