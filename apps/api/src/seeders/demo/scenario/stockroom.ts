import type { LotForm } from '@hidewright/contract';

export const suppliers = [
  {
    name: 'Oldbeck Tannery',
    email: 'hides@oldbeck.example.com',
    phone: '555-0111',
    leadDays: 9,
    note: 'Sides by the foot, measured on the flesh side.',
  },
  {
    name: 'Fennbridge Fittings',
    email: 'orders@fennbridge-fittings.example.com',
    phone: '555-0112',
    leadDays: 3,
    note: '',
  },
  {
    name: 'Kettlewell Engravers',
    email: 'plates@kettlewell.example.com',
    phone: '555-0113',
    leadDays: 5,
    note: 'Magnesium, copper and brass plates; mirrored artwork.',
  },
  {
    name: 'Straightedge Dies',
    email: 'dies@straightedge.example.com',
    phone: '555-0114',
    leadDays: 10,
    note: '',
  },
] as const;
type SupplierName = (typeof suppliers)[number]['name'];

export const presses = [
  {
    name: 'Clicker by the window',
    bedWidthMm: '610',
    bedDepthMm: '330',
    throatMm: '300',
    shutHeightMm: '95',
    ruleMm: '900',
    reliefAreaMm2: '1600',
  },
] as const;

/** What Kettlewell Engravers ask for a plate, and how long one lasts here. */
export const plateOffers = [
  { metal: 'magnesium', price: '46.00', lifeUses: 10_000 },
  { metal: 'copper', price: '118.00', lifeUses: 50_000 },
  { metal: 'brass', price: '310.00', lifeUses: 100_000 },
] as const;
/** 22 ft². */
const usualSide = { wholeForm: 'side', wholeAreaMm2: '2043866.88' } as const;

const [thirtyTwoFeet, sixtyFeet] = ['2972897.28', '5574182.4'];

export const leathers = [
  {
    name: 'Oak tan russet 5–6 oz',
    tannage: 'oak bark',
    colour: 'russet',
    finish: 'waxed',
    weightLowOz: '5',
    weightHighOz: '6',
    ...usualSide,
    pricePerFt2: '9.50',
    reorderAtMm2: sixtyFeet,
    supplier: 'Oldbeck Tannery',
  },
  {
    name: 'Oak tan natural 7–8 oz',
    tannage: 'oak bark',
    colour: 'natural',
    finish: 'unfinished',
    weightLowOz: '7',
    weightHighOz: '8',
    ...usualSide,
    pricePerFt2: '11.80',
    supplier: 'Oldbeck Tannery',
  },
  {
    name: 'Chestnut lining 3–4 oz',
    tannage: 'chestnut',
    colour: 'dark brown',
    finish: 'glazed',
    weightLowOz: '3',
    weightHighOz: '4',
    ...usualSide,
    pricePerFt2: '8.40',
    reorderAtMm2: thirtyTwoFeet,
    supplier: 'Oldbeck Tannery',
  },
] as const satisfies { supplier: SupplierName; [field: string]: string }[];
export type LeatherName = (typeof leathers)[number]['name'];

export const hardware = [
  {
    name: 'Rivets 7 mm, antique brass',
    kind: 'hardware',
    unitPrice: '0.11',
    packSize: 100,
    reorderAt: 300,
    bin: 'drawer 1',
    supplier: 'Fennbridge Fittings',
  },
  {
    name: 'D-rings 25 mm, solid brass',
    kind: 'hardware',
    unitPrice: '0.38',
    packSize: 50,
    reorderAt: 100,
    bin: 'drawer 3',
    supplier: 'Fennbridge Fittings',
  },
  {
    name: 'Buckles 20 mm, solid brass',
    kind: 'hardware',
    unitPrice: '0.62',
    packSize: 25,
    reorderAt: 100,
    bin: 'drawer 3',
    supplier: 'Fennbridge Fittings',
  },
  {
    name: 'Snaps, line 20, brass',
    kind: 'hardware',
    unitPrice: '0.24',
    packSize: 100,
    reorderAt: 300,
    bin: 'drawer 1',
    supplier: 'Fennbridge Fittings',
  },
  {
    name: 'Split rings 12 mm, nickel',
    kind: 'hardware',
    unitPrice: '0.07',
    packSize: 200,
    reorderAt: 200,
    bin: 'drawer 4',
    supplier: 'Fennbridge Fittings',
  },
  {
    name: 'Card sleeves, kraft',
    kind: 'supplies',
    unitPrice: '0.09',
    packSize: 250,
    reorderAt: 250,
    bin: 'packing shelf',
    supplier: 'Fennbridge Fittings',
  },
  {
    name: 'Edge dye, dark brown',
    kind: 'supplies',
    unit: 'ml',
    unitPrice: '0.04',
    packSize: 250,
    reorderAt: 250,
    bin: 'dye cupboard',
    supplier: 'Fennbridge Fittings',
  },
  {
    name: 'Rivet caps 7 mm, nickel',
    kind: 'hardware',
    unitPrice: '0.05',
    packSize: 100,
    reorderAt: 0,
    bin: 'drawer 2',
    supplier: 'Fennbridge Fittings',
  },
  {
    name: 'Rivet posts 8 mm, nickel',
    kind: 'hardware',
    unitPrice: '0.045',
    packSize: 100,
    reorderAt: 0,
    bin: 'drawer 2',
    supplier: 'Fennbridge Fittings',
  },
] as const satisfies { supplier: SupplierName; [field: string]: string | number }[];
export type HardwareName = (typeof hardware)[number]['name'];

/** What comes in over the year: the day counts back from the day on which the year ends. */
interface Purchase {
  daysBefore: number;
  supplier: SupplierName;
  leather?: {
    name: LeatherName;
    form: LotForm;
    areasFt2: string[];
    /** As the tannery stamped them on, in the same order. */
    markedFt2?: string[];
    /** As the gauge has them here, in the same order. */
    weightsOz?: string[];
    shade: string;
  }[];
  hardware?: { name: HardwareName; quantity: number; batch?: string; came?: number }[];
  /** What it cost to bring, typed by the owner. */
  freight?: string;
  /** What is still to come is awaited so many days after the year's end. */
  restInDays?: number;
}

export const purchases: Purchase[] = [
  {
    daysBefore: 372,
    supplier: 'Oldbeck Tannery',
    leather: [
      {
        name: 'Oak tan russet 5–6 oz',
        form: 'side',
        areasFt2: ['22.5', '24.2'],
        shade: 'red-brown',
      },
      {
        name: 'Oak tan natural 7–8 oz',
        form: 'side',
        areasFt2: ['23.1', '21.7', '24.4'],
        shade: 'pale',
      },
      { name: 'Chestnut lining 3–4 oz', form: 'side', areasFt2: ['20.4', '21.2'], shade: 'dark' },
    ],
  },
  {
    daysBefore: 371,
    supplier: 'Fennbridge Fittings',
    hardware: [
      { name: 'Rivets 7 mm, antique brass', quantity: 1500 },
      { name: 'D-rings 25 mm, solid brass', quantity: 500 },
      { name: 'Buckles 20 mm, solid brass', quantity: 500 },
      { name: 'Snaps, line 20, brass', quantity: 1200 },
      { name: 'Split rings 12 mm, nickel', quantity: 800 },
      { name: 'Card sleeves, kraft', quantity: 1500 },
      { name: 'Edge dye, dark brown', quantity: 1000 },
    ],
  },
  {
    daysBefore: 270,
    supplier: 'Oldbeck Tannery',
    leather: [
      { name: 'Oak tan russet 5–6 oz', form: 'side', areasFt2: ['23.8'], shade: 'red-brown' },
      {
        name: 'Oak tan natural 7–8 oz',
        form: 'side',
        areasFt2: ['24.6', '22.9', '23.7'],
        shade: 'pale',
      },
    ],
  },
  {
    daysBefore: 205,
    supplier: 'Fennbridge Fittings',
    hardware: [
      { name: 'Rivets 7 mm, antique brass', quantity: 1000 },
      { name: 'Snaps, line 20, brass', quantity: 1000 },
      { name: 'Card sleeves, kraft', quantity: 1000 },
      { name: 'Edge dye, dark brown', quantity: 500 },
    ],
  },
  {
    daysBefore: 168,
    supplier: 'Oldbeck Tannery',
    leather: [
      {
        name: 'Oak tan russet 5–6 oz',
        form: 'side',
        areasFt2: ['21.9', '23.3'],
        shade: 'a shade lighter',
      },
      { name: 'Oak tan natural 7–8 oz', form: 'side', areasFt2: ['22.1', '24.8'], shade: 'pale' },
      { name: 'Chestnut lining 3–4 oz', form: 'side', areasFt2: ['19.8', '20.6'], shade: 'dark' },
    ],
  },
  {
    daysBefore: 96,
    supplier: 'Oldbeck Tannery',
    leather: [
      {
        name: 'Oak tan natural 7–8 oz',
        form: 'side',
        areasFt2: ['23.4', '24.1', '22.8'],
        shade: 'pale',
      },
      { name: 'Oak tan russet 5–6 oz', form: 'side', areasFt2: ['22.2'], shade: 'red-brown' },
    ],
  },
  {
    daysBefore: 60,
    supplier: 'Fennbridge Fittings',
    hardware: [
      { name: 'Rivets 7 mm, antique brass', quantity: 600 },
      { name: 'D-rings 25 mm, solid brass', quantity: 100 },
      { name: 'Buckles 20 mm, solid brass', quantity: 200 },
      { name: 'Snaps, line 20, brass', quantity: 600 },
      { name: 'Card sleeves, kraft', quantity: 750 },
      { name: 'Edge dye, dark brown', quantity: 250 },
      { name: 'Rivet caps 7 mm, nickel', quantity: 200 },
      { name: 'Rivet posts 8 mm, nickel', quantity: 200 },
    ],
  },
  {
    daysBefore: 31,
    supplier: 'Oldbeck Tannery',
    freight: '18.40',
    leather: [
      {
        name: 'Oak tan russet 5–6 oz',
        form: 'side',
        areasFt2: ['24.4'],
        markedFt2: ['24.5'],
        weightsOz: ['5.6'],
        shade: 'red-brown',
      },
      {
        name: 'Oak tan natural 7–8 oz',
        form: 'side',
        areasFt2: ['22.6', '23.2'],
        markedFt2: ['23.5', '23.25'],
        weightsOz: ['7.4', '7.8'],
        shade: 'pale',
      },
    ],
  },
  {
    daysBefore: 9,
    supplier: 'Fennbridge Fittings',
    restInDays: 6,
    hardware: [
      { name: 'Card sleeves, kraft', quantity: 500, came: 500 },
      { name: 'D-rings 25 mm, solid brass', quantity: 250, came: 100, batch: 'DR-2611' },
    ],
  },
];

/** Ordered near the end of the year and not here yet. */
export const onItsWay = {
  daysBefore: 2,
  supplier: 'Fennbridge Fittings' as SupplierName,
  hardware: [
    { name: 'Split rings 12 mm, nickel' as HardwareName, quantity: 400 },
    { name: 'D-rings 25 mm, solid brass' as HardwareName, quantity: 250 },
  ],
};
