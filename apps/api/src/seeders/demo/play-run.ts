import { quoteTerms } from '@hidewright/contract';
import { addDays, addWorkdays } from '@hidewright/domain';
import { agreeQuote } from '../../flows/agree-quote.ts';
import { createQuote } from '../../flows/create-quote.ts';
import { declineQuote } from '../../flows/decline-quote.ts';
import { layPattern } from '../../flows/lay-pattern.ts';
import { noteArrival } from '../../flows/note-arrival.ts';
import { putQuoteOnPaper } from '../../flows/put-quote-on-paper.ts';
import { addTool, changeTool } from '../../flows/save-tool.ts';
import { sendQuote } from '../../flows/send-quote.ts';
import { takeOnOrder } from '../../flows/take-on-order.ts';
import { Order } from '../../modules/orders/order.entity.ts';
import { Tool } from '../../modules/tools/tool.entity.ts';
import type { DemoShop } from './demo-shop.ts';
import { planBooks } from './play-books.ts';
import { planChanges } from './play-changes.ts';
import { planWork } from './play-work.ts';
import { patterns } from './scenario/patterns.ts';
import type { DemoRun } from './scenario/runs.ts';
import { reaches, type Played, type Stage } from './stage.ts';

/** Plans one run from its enquiry to wherever it has come when the year ends. */
export function planRun(stage: Stage, run: DemoRun): void {
  const played: Played = { run, quoteId: 0, orderId: 0 };
  planOffer(stage, played);
  if (reaches(run, 'awaiting')) planTakingOn(stage, played);
  if (reaches(run, 'at the bench')) planWork(stage, played);
  if (reaches(run, 'shipped')) planBooks(stage, played);
}

function planOffer(stage: Stage, played: Played): void {
  const { shop, year } = stage;
  const { run } = played;
  year.plan(run.daysBefore, '09:10', () => quote(stage, played));
  if (run.fate === 'draft') return;
  year.planAfter(run.daysBefore, 1, '09:40', () => send(stage, played));
  if (run.fate === 'declined') {
    year.planAfter(run.daysBefore, 6, '15:00', async () => {
      await shop.as('owner', (work) =>
        declineQuote(work, { quoteId: played.quoteId, reason: 'The budget went elsewhere.' }),
      );
    });
  }
  if (!reaches(run, 'agreed')) return;
  year.planAfter(run.daysBefore, 2, '16:20', async () => {
    const agreement = {
      quoteId: played.quoteId,
      quantity: run.chosen,
      option: null,
      how: run.by ?? 'link',
    };
    if (agreement.how === 'link') await shop.byCustomer((work) => agreeQuote(work, agreement));
    else await shop.as('owner', (work) => agreeQuote(work, agreement));
  });
}

async function quote({ shop, year, furnished }: Stage, played: Played): Promise<void> {
  const { run } = played;
  const patternId = furnished.patterns.id(run.pattern);
  const laid = await layPattern(shop.context, patternId);
  const customerId = furnished.customers.id(run.customer);
  const reorder = await plateFor(shop, customerId, patternId);
  const needsPlate = patterns.some(
    (pattern) => pattern.name === run.pattern && pattern.definition.needsPlate,
  );
  const made = await shop.as('owner', (work) =>
    createQuote(
      work,
      {
        customerId,
        patternId,
        title: run.title,
        inHandsOn: addWorkdays(addDays(year.day(run.daysBefore), run.weeks * 7 - 1), 1),
        breaks: run.quantities.map((quantity) => ({
          quantity,
          typedPrice: quantity === run.chosen && run.typed !== undefined ? run.typed : null,
          rule: null,
        })),
        tooling:
          needsPlate && reorder === null
            ? [{ name: 'Stamp plate, magnesium', cost: '46.00', charge: '55.00' }]
            : [],
        message: '',
        terms: quoteTerms.parse({}),
        overrides: {},
      },
      laid,
    ),
  );
  played.quoteId = made.id;
}

const plateFor = (shop: DemoShop, customerId: number, patternId: number) =>
  shop.context.orm.em.fork().findOne(Tool, { kind: 'stamp plate', customerId, patternId });

async function send({ shop }: Stage, { quoteId }: Played): Promise<void> {
  const { host, port, publicUrl } = shop.context.config;
  const drawn = await putQuoteOnPaper(shop.context, shop.person('owner'), quoteId);
  const origin = publicUrl ?? `http://${host}:${port}`;
  await shop.as('owner', (work) =>
    sendQuote(work, quoteId, { by: 'mail', origin, mailAvailable: true }, drawn),
  );
}

/** The first run of a design waits for its proof and its plate; a reorder has both. */
function planTakingOn(stage: Stage, played: Played): void {
  const { shop, year } = stage;
  const { run } = played;
  year.planAfter(run.daysBefore, 3, '08:50', () => takeOn(stage, played));
  planChanges(stage, played);
  if (run.fate === 'awaiting') return;
  year.planAfter(run.daysBefore, 4, '10:30', () => arrive(shop, played, 'proof'));
  year.planAfter(run.daysBefore, 7, '10:45', async () => {
    await receivePlate(shop, played);
    await arrive(shop, played, 'tooling');
  });
}

async function takeOn({ shop, year, furnished }: Stage, played: Played): Promise<void> {
  const { run, quoteId } = played;
  const customerId = furnished.customers.id(run.customer);
  const patternId = furnished.patterns.id(run.pattern);
  const needsPlate = patterns.some(
    (pattern) => pattern.name === run.pattern && pattern.definition.needsPlate,
  );
  const plateToOrder = needsPlate && (await plateFor(shop, customerId, patternId)) === null;
  await shop.as('owner', async (work) => {
    if (plateToOrder) await orderPlate(work, { run, customerId, patternId });
    const order = await takeOnOrder(work, {
      quoteId,
      promisedOn: addWorkdays(year.day(run.daysBefore), run.weeks * 5 - 3),
      awaits: plateToOrder ? ['proof', 'tooling'] : [],
      evenIfShort: false,
    });
    played.orderId = order.id;
  });
}

async function orderPlate(
  work: Parameters<typeof addTool>[0],
  { run, customerId, patternId }: { run: DemoRun; customerId: number; patternId: number },
): Promise<void> {
  const plates = await work.em.count(Tool, { kind: 'stamp plate' });
  await addTool(work, {
    number: String(31 + plates),
    kind: 'stamp plate',
    name: run.title,
    metal: 'magnesium',
    cost: '46.00',
    lifeUses: 10_000,
    slot: `C${plates + 1}`,
    patternId,
    customerId,
    ownedBy: 'shop',
    keptUntil: null,
    state: 'on order',
    piecesPerStrike: 1,
    ruleThicknessMm: null,
    borderMm: '1.5',
    reliefAreaMm2: '640',
  });
}

async function receivePlate(shop: DemoShop, { orderId }: Played): Promise<void> {
  await shop.as('owner', async (work) => {
    const order = await work.em.findOneOrFail(Order, orderId);
    for (const plate of await work.em.find(Tool, {
      customerId: order.customerId,
      state: 'on order',
    })) {
      await changeTool(work, {
        id: plate.id,
        ifMatch: plate.version,
        change: { state: 'on the rack' },
      });
    }
  });
}

async function arrive(
  shop: DemoShop,
  { orderId }: Played,
  what: 'proof' | 'tooling',
): Promise<void> {
  await shop.as('owner', async (work) => {
    const order = await work.em.findOneOrFail(Order, orderId);
    if (order.awaits.includes(what)) await noteArrival(work, orderId, what);
  });
}
