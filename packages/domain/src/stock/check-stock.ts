import type { HardwareUnit } from '../hardware/units.ts';
import type { LeatherWeight } from '../leather/leather-weight.ts';
import type { DecimalText } from '../numbers/decimal-text.ts';
import type { Bench, WorkPart } from '../promise/bench-time.ts';
import type { Day } from '../promise/day.ts';
import type { HeldWork } from '../promise/held-work.ts';
import type { CutFrom, LotToCut } from './pieces-from-lot.ts';
import type { PromisePool } from './promise-pool.ts';
import type { OfferTerms } from './supplier-offer.ts';
import type { Whole } from './wholes.ts';

/** Where more of an item comes from. */
export interface Sourcing {
  /** both null where nobody is named who sells it */
  supplierId: number | null;
  supplier: string | null;
  /** when it is here if it is ordered today; null where nobody is named */
  arrivesOn: Day | null;
  /** as they sell it; leather in mm² and by the ft² */
  terms: OfferTerms;
  /** drafted for it and not sent yet: pieces, or thousandths of mm² */
  drafted: number;
  /** the numbers of those drafts */
  drafts: readonly string[];
  /** orders that should have brought some by now, and are not counted on */
  overdue?: readonly string[];
}

/** What may be taken in place of an item: itself, or of a kit the parts that one of it is made of. */
export interface StandInStock {
  name: string;
  parts: readonly { hardwareId: number; quantity: number }[];
}

/** Hardware or supplies, in their units. */
export interface ItemStock {
  hardwareId: number;
  name: string;
  kind: 'hardware' | 'supplies';
  /** what one of it is; a piece where nobody said */
  unit?: HardwareUnit;
  /** the customer brings it: it is never bought */
  fromCustomer?: boolean;
  /** in the order in which they are offered; their parts are among the shop's items */
  standIns?: readonly StandInStock[];
  pool: PromisePool;
  buying: Sourcing;
}

export interface RackLot extends LotToCut {
  lotId: number;
  tag: string;
  place: string;
  shade: string;
  receivedOn: Day;
  /** its own; where there is none it goes by its leather's */
  weightOz?: DecimalText | null;
}

/** A leather: its lots, and what of it is yet to come in thousandths of mm² that can be cut. */
export interface LeatherStock {
  leatherId: number;
  name: string;
  /** as it is sold */
  weight?: LeatherWeight;
  lots: readonly RackLot[];
  /** what jobs taken on still need and do not hold, in thousandths of mm² */
  owed: number;
  /** what comes; nothing is free in it, for that lies in the lots */
  pool: PromisePool;
  /** what it is bought as, whole; null where nobody said */
  whole: Whole | null;
  /** the share of what is bought that can be cut */
  usablePercent: DecimalText;
  buying: Sourcing;
}

export interface ToolStock {
  toolId: number;
  name: string;
  strikesLeft: number;
  piecesPerStrike: number;
}

/** All that runs may be given, as it stands before any of them. */
export interface ShopStock {
  today: Day;
  bench: Bench;
  held: readonly HeldWork[];
  leathers: readonly LeatherStock[];
  items: readonly ItemStock[];
  tools: readonly ToolStock[];
}

export interface LeatherNeed {
  leatherId: number;
  cut: CutFrom;
  /** pieces by a layout on the whole lot as drawn, where there is one */
  laid: ReadonlyMap<number, number>;
  /** the shade of the lot that an earlier run was cut from; null where it is no reorder */
  likeShade: string | null;
}

export interface ToolNeed {
  /** Cutting die, Stamp plate, Setting die SD-9 */
  word: string;
  /** those on the rack that serve, the fittest first */
  choices: readonly number[];
  /** what to do where none is here */
  otherwise: string;
  /** of a setting die, the hardware that it sets */
  setsHardwareId?: number | undefined;
}

export interface HardwareNeed {
  hardwareId: number;
  quantity: number;
  /** of it, what the pieces ordered take where nothing is lost; all of it where nobody said */
  ordered?: number;
}

/** What one run asks for. */
export interface RunNeeds {
  /** the day by which it must be packed */
  by: Day;
  /** pieces to cut */
  pieces: number;
  leather: LeatherNeed;
  hardware: readonly HardwareNeed[];
  tools: readonly ToolNeed[];
  /** bench time in hundredths of a minute, and the same with the waits between steps */
  minutes: number;
  parts: readonly WorkPart[];
}
