import type { CustomerName } from './customers.ts';
import type { PatternName } from './patterns.ts';

/** How far a run has come on the day on which the year ends. */
export type Fate =
  | 'draft'
  | 'sent'
  | 'declined'
  | 'lapsed'
  | 'agreed'
  | 'awaiting'
  | 'ready'
  | 'at the bench'
  | 'packed'
  | 'shipped'
  | 'invoiced'
  | 'part paid'
  | 'paid';

export interface DemoRun {
  /** The enquiry's day, counted back from the day on which the year ends. */
  daysBefore: number;
  customer: CustomerName;
  pattern: PatternName;
  /** What the artwork is called. */
  title: string;
  quantities: [number, ...number[]];
  /** Which of the quantities was agreed. */
  chosen: number;
  /** Weeks from the enquiry to the day in hands. */
  weeks: number;
  fate: Fate;
  by?: 'link' | 'phone';
  /** A price that the owner typed for the chosen quantity. */
  typed?: string;
  /** Fact over estimate, for minutes and for rejects. */
  slower: number;
  spoiled: number;
  /** Days from invoice to payment. */
  paidAfter?: number;
  method?: 'bank' | 'card' | 'cash' | 'cheque';
}

export const runs: DemoRun[] = [
  { daysBefore: 362, customer: 'The Copper Heron', pattern: 'Luggage tag with neck', title: 'Heron crest tags', quantities: [50, 100, 250], chosen: 100, weeks: 4, fate: 'paid', slower: 1.12, spoiled: 1.3, paidAfter: 21, method: 'bank' },
  { daysBefore: 350, customer: 'Brambling Brewery', pattern: 'Drinks coaster, round', title: 'Hop leaf coasters', quantities: [100, 200, 400], chosen: 200, weeks: 5, fate: 'paid', slower: 1.08, spoiled: 0.9, paidAfter: 28, method: 'bank' },
  { daysBefore: 331, customer: 'Quillfeather Books', pattern: 'Bookmark', title: 'Quill bookmarks', quantities: [100, 150, 300], chosen: 150, weeks: 4, fate: 'paid', by: 'phone', slower: 1.05, spoiled: 1.1, paidAfter: 14, method: 'cheque' },
  { daysBefore: 318, customer: 'Tern Street Outfitters', pattern: 'Zip-pull', title: 'Tern zip-pulls', quantities: [100, 200, 500], chosen: 200, weeks: 3, fate: 'paid', slower: 0.96, spoiled: 0.8, paidAfter: 30, method: 'bank' },
  { daysBefore: 305, customer: 'Saltmarsh Rowing Club', pattern: 'Cord wrap with two snaps', title: 'Regatta wraps', quantities: [60, 120], chosen: 60, weeks: 4, fate: 'paid', slower: 1.1, spoiled: 1.4, paidAfter: 9, method: 'bank' },
  { daysBefore: 290, customer: 'Odalys & Pim', pattern: 'Cord wrap with two snaps', title: 'Sample favours', quantities: [20, 40], chosen: 20, weeks: 3, fate: 'declined', slower: 1, spoiled: 1 },
  { daysBefore: 281, customer: 'The Copper Heron', pattern: 'Drinks coaster, round', title: 'Heron crest coasters', quantities: [50, 120, 240], chosen: 120, weeks: 5, fate: 'paid', slower: 1.02, spoiled: 1, paidAfter: 25, method: 'bank' },
  { daysBefore: 262, customer: 'Tern Street Outfitters', pattern: 'Valet tray panel', title: 'Tern valet trays', quantities: [20, 40], chosen: 20, weeks: 5, fate: 'paid', typed: '21.5', slower: 1.15, spoiled: 1.2, paidAfter: 33, method: 'bank' },
  { daysBefore: 247, customer: 'Brambling Brewery', pattern: 'Drinks coaster, round', title: 'Hop leaf coasters', quantities: [100, 200, 400], chosen: 200, weeks: 4, fate: 'paid', by: 'phone', slower: 0.97, spoiled: 0.8, paidAfter: 30, method: 'bank' },
  { daysBefore: 229, customer: 'Quillfeather Books', pattern: 'Bookmark', title: 'Quill bookmarks', quantities: [100, 200, 300], chosen: 200, weeks: 4, fate: 'paid', slower: 1, spoiled: 0.9, paidAfter: 16, method: 'cheque' },
  { daysBefore: 214, customer: 'Saltmarsh Rowing Club', pattern: 'Luggage tag with neck', title: 'Oar bag tags', quantities: [40, 80], chosen: 80, weeks: 4, fate: 'paid', slower: 1.04, spoiled: 1, paidAfter: 12, method: 'bank' },
  { daysBefore: 198, customer: 'The Copper Heron', pattern: 'Luggage tag with neck', title: 'Heron crest tags', quantities: [100, 150, 250], chosen: 150, weeks: 4, fate: 'paid', slower: 0.98, spoiled: 0.7, paidAfter: 24, method: 'bank' },
  { daysBefore: 180, customer: 'Tern Street Outfitters', pattern: 'Cord wrap with two snaps', title: 'Tern cord wraps', quantities: [100, 200], chosen: 100, weeks: 4, fate: 'paid', slower: 1.01, spoiled: 1.1, paidAfter: 38, method: 'bank' },
  { daysBefore: 163, customer: 'Brambling Brewery', pattern: 'Luggage tag with neck', title: 'Taproom key tags', quantities: [30, 60], chosen: 60, weeks: 4, fate: 'paid', slower: 1.06, spoiled: 1, paidAfter: 27, method: 'bank' },
  { daysBefore: 149, customer: 'Quillfeather Books', pattern: 'Zip-pull', title: 'Tote bag pulls', quantities: [100, 200], chosen: 100, weeks: 3, fate: 'paid', slower: 0.93, spoiled: 0.6, paidAfter: 15, method: 'card' },
  { daysBefore: 133, customer: 'The Copper Heron', pattern: 'Drinks coaster, round', title: 'Heron crest coasters', quantities: [60, 120, 240], chosen: 120, weeks: 4, fate: 'paid', slower: 0.95, spoiled: 0.9, paidAfter: 22, method: 'bank' },
  { daysBefore: 118, customer: 'Saltmarsh Rowing Club', pattern: 'Cord wrap with two snaps', title: 'Crew wraps', quantities: [60, 120], chosen: 120, weeks: 4, fate: 'paid', slower: 1, spoiled: 0.8, paidAfter: 11, method: 'bank' },
  { daysBefore: 103, customer: 'Odalys & Pim', pattern: 'Luggage tag with neck', title: 'Honeymoon tags', quantities: [20, 40], chosen: 20, weeks: 4, fate: 'lapsed', slower: 1, spoiled: 1 },
  { daysBefore: 92, customer: 'Tern Street Outfitters', pattern: 'Luggage tag with neck', title: 'Tern travel tags', quantities: [50, 100, 200], chosen: 100, weeks: 4, fate: 'part paid', slower: 1.03, spoiled: 1, paidAfter: 35, method: 'bank' },
  { daysBefore: 78, customer: 'Brambling Brewery', pattern: 'Drinks coaster, round', title: 'Harvest ale coasters', quantities: [100, 200, 400], chosen: 200, weeks: 4, fate: 'invoiced', slower: 0.96, spoiled: 0.9 },
  { daysBefore: 62, customer: 'Quillfeather Books', pattern: 'Bookmark', title: 'Quill bookmarks', quantities: [150, 300], chosen: 150, weeks: 4, fate: 'paid', slower: 0.94, spoiled: 0.7, paidAfter: 10, method: 'cheque' },
  { daysBefore: 48, customer: 'Tern Street Outfitters', pattern: 'Valet tray panel', title: 'Tern valet trays', quantities: [20, 40], chosen: 20, weeks: 5, fate: 'invoiced', typed: '23', slower: 1.05, spoiled: 0.9 },
  { daysBefore: 33, customer: 'Saltmarsh Rowing Club', pattern: 'Luggage tag with neck', title: 'Boathouse tags', quantities: [40, 80], chosen: 40, weeks: 4, fate: 'shipped', slower: 1, spoiled: 0.9 },
  { daysBefore: 27, customer: 'Tern Street Outfitters', pattern: 'Zip-pull', title: 'Tern zip-pulls', quantities: [200, 500], chosen: 200, weeks: 4, fate: 'packed', slower: 0.95, spoiled: 0.7 },
  { daysBefore: 20, customer: 'The Copper Heron', pattern: 'Luggage tag with neck', title: 'Heron crest tags', quantities: [50, 100, 250], chosen: 100, weeks: 5, fate: 'at the bench', slower: 0.97, spoiled: 0.8 },
  { daysBefore: 16, customer: 'Brambling Brewery', pattern: 'Drinks coaster, round', title: 'Winter ale coasters', quantities: [100, 200], chosen: 100, weeks: 5, fate: 'ready', by: 'phone', slower: 1, spoiled: 1 },
  { daysBefore: 12, customer: 'Odalys & Pim', pattern: 'Cord wrap with two snaps', title: 'Wedding favours', quantities: [60, 90, 120], chosen: 90, weeks: 5, fate: 'awaiting', slower: 1, spoiled: 1 },
  { daysBefore: 6, customer: 'Quillfeather Books', pattern: 'Bookmark', title: 'Fen map bookmarks', quantities: [100, 200], chosen: 200, weeks: 5, fate: 'agreed', slower: 1, spoiled: 1 },
  { daysBefore: 4, customer: 'Tern Street Outfitters', pattern: 'Luggage tag with neck', title: 'Tern travel tags', quantities: [100, 200, 400], chosen: 200, weeks: 6, fate: 'sent', slower: 1, spoiled: 1 },
  { daysBefore: 1, customer: 'Saltmarsh Rowing Club', pattern: 'Cord wrap with two snaps', title: 'Novice crew wraps', quantities: [60, 120], chosen: 60, weeks: 7, fate: 'draft', slower: 1, spoiled: 1 },
];
