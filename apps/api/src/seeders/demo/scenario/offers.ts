/** 100 ft² in mm². */
const hundredFeet = '9290304';

/** What the suppliers ask, beside the one price that quotes reckon with. */
export const offers = [
  {
    hardware: 'Rivets 7 mm, antique brass',
    supplier: 'Fennbridge Fittings',
    articleNumber: 'RV-7-AB',
    leadDays: null,
    minimum: '100',
    multiple: '100',
    breaks: [
      { from: '100', price: '0.11' },
      { from: '1000', price: '0.098' },
      { from: '5000', price: '0.085' },
    ],
  },
  {
    hardware: 'Rivets 7 mm, antique brass',
    supplier: 'Straightedge Dies',
    articleNumber: '7071',
    leadDays: 6,
    minimum: '500',
    multiple: '500',
    breaks: [
      { from: '500', price: '0.104' },
      { from: '2500', price: '0.092' },
    ],
  },
  {
    leather: 'Oak tan russet 5–6 oz',
    supplier: 'Oldbeck Tannery',
    articleNumber: 'OTR 56',
    leadDays: null,
    minimum: null,
    multiple: null,
    breaks: [
      { from: '0', price: '9.50' },
      { from: hundredFeet, price: '9.10' },
    ],
  },
] as const;

/** A rivet is a cap and a post; these stand in for the brass ones, and the other way round. */
export const kit = {
  name: 'Rivets 7 mm, nickel',
  parts: ['Rivet caps 7 mm, nickel', 'Rivet posts 8 mm, nickel'],
  standsInFor: 'Rivets 7 mm, antique brass',
  metal: 'steel',
  colour: 'nickel',
  bin: 'drawer 2',
  stackMinMm: '3.5',
  stackMaxMm: '5',
  settingDie: 'SD-7',
} as const;
