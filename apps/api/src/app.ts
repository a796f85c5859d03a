import { readFile } from 'node:fs/promises';
import { existsSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import express, { type Express, type RequestHandler, type Router } from 'express';
import helmet from 'helmet';
import type { Context } from './context.ts';
import { compressed } from './http/compressed.ts';
import { errorHandler } from './http/error-handler.ts';
import { notFound } from './http/problem.ts';
import { requestLog } from './http/request-log.ts';
import { sameOrigin } from './http/same-origin.ts';
import { sessions } from './http/session.ts';
import { activityRoutes } from './modules/activity/activity.routes.ts';
import { countRoutes } from './modules/counts/counts.routes.ts';
import { finishedPieceRoutes } from './modules/finished-pieces/finished-pieces.routes.ts';
import { checkRoutes } from './modules/checks/checks.routes.ts';
import { customerRoutes } from './modules/customers/customers.routes.ts';
import { designRoutes } from './modules/designs/designs.routes.ts';
import { hardwareRoutes } from './modules/hardware/hardware.routes.ts';
import { invoiceRoutes } from './modules/invoices/invoices.routes.ts';
import { jobRoutes } from './modules/jobs/jobs.routes.ts';
import { labelRoutes } from './modules/labels/labels.routes.ts';
import { layoutRoutes } from './modules/layouts/layouts.routes.ts';
import { leatherRoutes } from './modules/leathers/leathers.routes.ts';
import { linkRoutes } from './modules/links/links.routes.ts';
import { lotFamilyRoutes } from './modules/lots/lot-family.routes.ts';
import { lotPhotoRoutes } from './modules/lots/lot-photos.routes.ts';
import { lotSearchRoutes } from './modules/lots/lot-searches.routes.ts';
import { lotRoutes } from './modules/lots/lots.routes.ts';
import { orderSuggestionRoutes } from './modules/order-suggestions/order-suggestions.routes.ts';
import { offcutRoutes } from './modules/lots/offcuts.routes.ts';
import { orderChangeRoutes } from './modules/orders/order-changes.routes.ts';
import { orderRoutes } from './modules/orders/orders.routes.ts';
import { learnedRoutes } from './modules/patterns/learned.routes.ts';
import { patternRoutes } from './modules/patterns/patterns.routes.ts';
import { peopleRoutes } from './modules/people/people.routes.ts';
import { periodRoutes } from './modules/periods/periods.routes.ts';
import { pressRoutes } from './modules/presses/presses.routes.ts';
import { purchaseOrderRoutes } from './modules/purchase-orders/purchase-orders.routes.ts';
import { quoteRoutes } from './modules/quotes/quotes.routes.ts';
import { scanRoutes } from './modules/scans/scans.routes.ts';
import { receiptRoutes } from './modules/receipts/receipts.routes.ts';
import { searchRoutes } from './modules/search/search.routes.ts';
import { stockLevelRoutes } from './modules/stock/stock-levels.routes.ts';
import { stockRoutes } from './modules/stock/stock.routes.ts';
import { supplierOfferRoutes } from './modules/supplier-offers/supplier-offers.routes.ts';
import { supplierClaimRoutes } from './modules/supplier-claims/supplier-claims.routes.ts';
import { supplierReturnRoutes } from './modules/supplier-returns/supplier-returns.routes.ts';
import { supplierRoutes } from './modules/suppliers/suppliers.routes.ts';
import { taxRateRoutes } from './modules/tax-rates/tax-rates.routes.ts';
import { timeReadingRoutes } from './modules/time-readings/time-readings.routes.ts';
import { todayRoutes } from './modules/today/today.routes.ts';
import { plateOfferRoutes } from './modules/tools/plate-offers.routes.ts';
import { toolRoutes } from './modules/tools/tools.routes.ts';
import { weekMixRoutes } from './modules/week-mixes/week-mixes.routes.ts';
import { workshopRoutes } from './modules/workshop/workshop.routes.ts';
import { sessionRoutes } from './modules/session/session.routes.ts';
import { systemRoutes } from './modules/system/system.routes.ts';

/** Every room of the API. */
const rooms: ((context: Context) => Router)[] = [
  systemRoutes,
  leatherRoutes,
  workshopRoutes,
  peopleRoutes,
  activityRoutes,
  todayRoutes,
  searchRoutes,
  scanRoutes,
  customerRoutes,
  quoteRoutes,
  linkRoutes,
  orderRoutes,
  orderChangeRoutes,
  checkRoutes,
  patternRoutes,
  learnedRoutes,
  designRoutes,
  timeReadingRoutes,
  layoutRoutes,
  toolRoutes,
  plateOfferRoutes,
  pressRoutes,
  jobRoutes,
  lotRoutes,
  lotPhotoRoutes,
  offcutRoutes,
  lotFamilyRoutes,
  lotSearchRoutes,
  hardwareRoutes,
  supplierRoutes,
  supplierOfferRoutes,
  purchaseOrderRoutes,
  receiptRoutes,
  supplierClaimRoutes,
  supplierReturnRoutes,
  stockRoutes,
  stockLevelRoutes,
  orderSuggestionRoutes,
  countRoutes,
  finishedPieceRoutes,
  labelRoutes,
  invoiceRoutes,
  taxRateRoutes,
  periodRoutes,
  weekMixRoutes,
];

const web = fileURLToPath(new URL('../../web/dist', import.meta.url));

/** The whole application, not yet listening. */
export async function createApp(context: Context): Promise<Express> {
  const app = express();
  const { middleware, authenticate } = await sessions(context);
  app.disable('x-powered-by');
  app.set('query parser', 'simple');
  app.set('etag', false);
  app.use(requestLog(context));
  app.use(helmet(headers(context)));
  app.use(compressed());
  app.use(
    '/api',
    noStore,
    sameOrigin(context.config),
    express.json({ limit: '1mb' }),
    ...middleware,
  );
  app.use('/api', sessionRoutes(context, authenticate), ...rooms.map((room) => room(context)));
  app.use('/api', () => {
    throw notFound('address');
  });
  await serveWeb(app);
  app.use(errorHandler);
  return app;
}

const noStore: RequestHandler = (_request, response, next) => {
  response.set('Cache-Control', 'no-store');
  next();
};

function headers(context: Context): Parameters<typeof helmet>[0] {
  const overTls = context.config.tls !== undefined;
  return {
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        objectSrc: ["'none'"],
        baseUri: ["'none'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
      },
    },
    frameguard: { action: 'deny' },
    strictTransportSecurity: overTls,
    crossOriginOpenerPolicy: overTls,
    originAgentCluster: overTls,
    referrerPolicy: { policy: 'no-referrer' },
  };
}

/** The built web application; every address that is no file is answered by its page. */
async function serveWeb(app: Express): Promise<void> {
  const page = path.join(web, 'index.html');
  if (!existsSync(page)) return;
  const html = await readFile(page, 'utf8');
  app.use(express.static(web, { index: false, setHeaders: cacheForever }));
  // A page that is open since before an upgrade asks for files that are gone: it must hear so, and not get a page.
  app.use('/assets', (_request, response) => {
    response.status(404).type('text').send('This file is not there any more. Load the page again.');
  });
  app.get('/{*path}', (_request, response) => {
    response.type('html').set('Cache-Control', 'no-store').send(html);
  });
}

/** Built files carry a hash in their names. */
function cacheForever(
  response: { setHeader(name: string, value: string): void },
  file: string,
): void {
  if (file.includes(`${path.sep}assets${path.sep}`)) {
    response.setHeader('Cache-Control', 'public, max-age=31536000, immutable');
  }
}
