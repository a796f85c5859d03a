import { existsSync } from 'node:fs';
import { mkdir, rename, rm } from 'node:fs/promises';
import path from 'node:path';
import { databaseFile, type Config } from '../../config.ts';
import { closeContext, createContext } from '../../context.ts';
import { lapseQuotes } from '../../flows/lapse-quotes.ts';
import { OutgoingMail } from '../../modules/mail/outgoing-mail.entity.ts';
import { dayIn } from '../../day-in.ts';
import { SetClock, systemClock } from '../../outside/clock.ts';
import { planPurchases } from './buy.ts';
import { DemoShop } from './demo-shop.ts';
import { planBorrowedPlate } from './furnish-tooling.ts';
import { furnish } from './furnish.ts';
import { planDyeing } from './have-dyed.ts';
import { planCounts } from './play-counts.ts';
import { planLocks } from './play-books.ts';
import { planRun } from './play-run.ts';
import { runs } from './scenario/runs.ts';
import { planShelfSale } from './sell-shelf.ts';
import { Year } from './year.ts';

/**
 * Makes the demo workshop in an empty data folder: twelve months that end on DEMO_DAY, today unless it is set.
 * It is made beside and moved in when it is whole, so that nothing half made is ever opened.
 */
export async function makeDemo(config: Config): Promise<void> {
  if (existsSync(databaseFile(config.dataDir))) return;
  const unfinished = path.join(config.dataDir, 'demo-being-made');
  await rm(unfinished, { recursive: true, force: true });
  await mkdir(unfinished, { recursive: true });
  await playYear({ ...config, dataDir: unfinished });
  await rm(path.join(config.dataDir, 'files'), { recursive: true, force: true });
  if (existsSync(path.join(unfinished, 'files'))) {
    await rename(path.join(unfinished, 'files'), path.join(config.dataDir, 'files'));
  }
  await rename(databaseFile(unfinished), databaseFile(config.dataDir));
  await rm(unfinished, { recursive: true, force: true });
}

async function playYear(config: Config): Promise<void> {
  const end = config.demoDay ?? dayIn('UTC', systemClock.now());
  const year = new Year(end);
  const clock = new SetClock(new Date(`${year.day(380)}T08:00:00.000Z`));
  const context = await createContext(config, { clock, synchronous: 'OFF' });
  try {
    const shop = new DemoShop(context, clock);
    const furnished = await furnish(shop);
    planPurchases(shop, year, furnished);
    for (const run of runs) planRun({ shop, year, furnished }, run);
    planBorrowedPlate({ shop, year, furnished });
    planShelfSale({ shop, year, furnished });
    planCounts(shop, year);
    planDyeing(shop, year);
    planLocks(shop, year);
    year.plan(0, '06:00', async () => {
      await shop.as('owner', lapseQuotes);
    });
    for (const moment of year.moments) {
      clock.set(moment.at);
      await moment.happens();
    }
    await letOldMailRest(shop, year);
    await context.orm.em.getConnection().execute('PRAGMA wal_checkpoint(TRUNCATE)');
  } finally {
    await closeContext(context);
  }
}

/** The mail of the last week leaves when the demo starts; what is older has long been read. */
async function letOldMailRest(shop: DemoShop, year: Year): Promise<void> {
  const em = shop.context.orm.em.fork();
  for (const mail of await em.find(OutgoingMail, {
    state: 'waiting',
    createdAt: { $lt: `${year.day(7)}T00:00:00.000Z` },
  })) {
    mail.state = 'sent';
    mail.sentAt = mail.createdAt;
    mail.attempts = 1;
  }
  await em.flush();
}
