import { TheHouse } from './migration-20261201-the-house.ts';
import { ThePresses } from './migration-20261201-the-presses.ts';
import { TheSides } from './migration-20261201-the-sides.ts';
import { TheTimeStudy } from './migration-20261201-the-time-study.ts';
import { TheTools } from './migration-20261201-the-tools.ts';
import { TheWorkings } from './migration-20261201-the-workings.ts';
import { ThePhotos } from './migration-20261202-the-photos.ts';
import { TheCounts } from './migration-20261203-the-counts.ts';
import { TheDeliveries } from './migration-20261203-the-deliveries.ts';
import { TheDesigns } from './migration-20261203-the-designs.ts';
import { TheOffers } from './migration-20261203-the-offers.ts';
import { TheFamily } from './migration-20261204-the-family.ts';
import { TheOrdersDue } from './migration-20261204-the-orders-due.ts';
import { TheShelf } from './migration-20261204-the-shelf.ts';
import { TheServices } from './migration-20261205-the-services.ts';
import { TheWeights } from './migration-20261206-the-weights.ts';
import { TheShelfSales } from './migration-20261207-the-shelf-sales.ts';
import { TheDays } from './migration-20261208-the-days.ts';
import { TheChangedOrders } from './migration-20261209-the-changed-orders.ts';
import { TheMarks } from './migration-20261209-the-marks.ts';
import { TheCredits } from './migration-20261210-the-credits.ts';
import { TheDraftedFor } from './migration-20261211-the-drafted-for.ts';

/** In the order in which they run; a test compares this list with the folder. */
export const migrations = [
  { name: 'migration-20261201-the-house', class: TheHouse },
  { name: 'migration-20261201-the-presses', class: ThePresses },
  { name: 'migration-20261201-the-sides', class: TheSides },
  { name: 'migration-20261201-the-time-study', class: TheTimeStudy },
  { name: 'migration-20261201-the-tools', class: TheTools },
  { name: 'migration-20261201-the-workings', class: TheWorkings },
  { name: 'migration-20261202-the-photos', class: ThePhotos },
  { name: 'migration-20261203-the-counts', class: TheCounts },
  { name: 'migration-20261203-the-deliveries', class: TheDeliveries },
  { name: 'migration-20261203-the-designs', class: TheDesigns },
  { name: 'migration-20261203-the-offers', class: TheOffers },
  { name: 'migration-20261204-the-family', class: TheFamily },
  { name: 'migration-20261204-the-orders-due', class: TheOrdersDue },
  { name: 'migration-20261204-the-shelf', class: TheShelf },
  { name: 'migration-20261205-the-services', class: TheServices },
  { name: 'migration-20261206-the-weights', class: TheWeights },
  { name: 'migration-20261207-the-shelf-sales', class: TheShelfSales },
  { name: 'migration-20261208-the-days', class: TheDays },
  { name: 'migration-20261209-the-changed-orders', class: TheChangedOrders },
  { name: 'migration-20261209-the-marks', class: TheMarks },
  { name: 'migration-20261210-the-credits', class: TheCredits },
  { name: 'migration-20261211-the-drafted-for', class: TheDraftedFor },
];
