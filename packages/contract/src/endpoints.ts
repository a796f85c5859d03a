import * as activity from './activity.ts';
import * as benchHours from './bench-hours.ts';
import * as counts from './counts.ts';
import * as checks from './checks.ts';
import * as customers from './customers.ts';
import * as cutAdvice from './cut-advice.ts';
import * as designs from './designs.ts';
import type { Endpoint } from './endpoint.ts';
import * as finishedPieces from './finished-pieces.ts';
import * as hardware from './hardware.ts';
import * as invoices from './invoices.ts';
import * as jobs from './jobs.ts';
import * as labels from './labels.ts';
import * as layouts from './layouts.ts';
import * as learned from './learned.ts';
import * as leathers from './leathers.ts';
import * as links from './links.ts';
import * as lotFamily from './lot-family.ts';
import * as lotPhotos from './lot-photos.ts';
import * as lotSearches from './lot-searches.ts';
import * as lots from './lots.ts';
import * as orderSuggestions from './order-suggestions.ts';
import * as offcuts from './offcuts.ts';
import * as orderChanges from './order-changes.ts';
import * as orders from './orders.ts';
import * as patterns from './patterns.ts';
import * as people from './people.ts';
import * as periods from './periods.ts';
import * as plateOffers from './plate-offers.ts';
import * as presses from './presses.ts';
import * as purchaseLines from './purchase-lines.ts';
import * as purchaseOrders from './purchase-orders.ts';
import * as quotes from './quotes.ts';
import * as scans from './scans.ts';
import * as receipts from './receipts.ts';
import * as search from './search.ts';
import * as session from './session.ts';
import * as stockLevels from './stock-levels.ts';
import * as stock from './stock.ts';
import * as supplierOffers from './supplier-offers.ts';
import * as supplierClaims from './supplier-claims.ts';
import * as supplierReturns from './supplier-returns.ts';
import * as suppliers from './suppliers.ts';
import * as system from './system.ts';
import * as taxRates from './tax-rates.ts';
import * as timeReadings from './time-readings.ts';
import * as today from './today.ts';
import * as toolingAdvice from './tooling-advice.ts';
import * as tools from './tools.ts';
import * as variances from './variances.ts';
import * as weekMixes from './week-mixes.ts';
import * as workshop from './workshop.ts';

const rooms: Record<string, unknown>[] = [
  system,
  session,
  workshop,
  people,
  activity,
  today,
  search,
  scans,
  customers,
  quotes,
  links,
  orders,
  orderChanges,
  checks,
  patterns,
  learned,
  timeReadings,
  cutAdvice,
  designs,
  layouts,
  tools,
  plateOffers,
  toolingAdvice,
  presses,
  jobs,
  variances,
  benchHours,
  weekMixes,
  leathers,
  lots,
  lotPhotos,
  offcuts,
  lotFamily,
  lotSearches,
  hardware,
  suppliers,
  supplierOffers,
  purchaseLines,
  purchaseOrders,
  receipts,
  supplierClaims,
  supplierReturns,
  stock,
  stockLevels,
  finishedPieces,
  orderSuggestions,
  counts,
  labels,
  invoices,
  taxRates,
  periods,
];

const isEndpoint = (value: unknown): value is Endpoint =>
  typeof value === 'object' &&
  value !== null &&
  'method' in value &&
  'path' in value &&
  'access' in value;

/** Everything the API does. A room's file is named here once; its endpoints are then served, documented and tested. */
export const endpoints: readonly Endpoint[] = rooms.flatMap((room) =>
  Object.values(room).filter(isEndpoint),
);
