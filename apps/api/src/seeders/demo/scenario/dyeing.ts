/** Who dyes leather for the shop. */
export const dyeWorks = {
  name: 'Fenside Dye Works',
  email: 'vats@fenside.example.com',
  phone: '555-0117',
  leadDays: 8,
  note: 'Shoulders and sides up to 30 ft²; they measure by machine.',
} as const;

const kind = {
  tannage: 'oak bark',
  finish: 'unfinished',
  weightLowOz: '3',
  weightHighOz: '4',
  wholeForm: 'shoulder',
  wholeAreaMm2: '743224.32',
} as const;

/** A shoulder to try a colour on: as it came, and as it is to become. */
export const shoulders = {
  before: { ...kind, name: 'Shoulder natural 3–4 oz', colour: 'natural', pricePerFt2: '7.60' },
  after: { ...kind, name: 'Shoulder black 3–4 oz', colour: 'black', pricePerFt2: '9.40' },
} as const;

export const dyeing = { areaFt2: '8.2', pricePerFt2: '1.65', place: 'rack 3' } as const;
