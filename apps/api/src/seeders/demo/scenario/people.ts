import type { Person } from '../../../modules/people/person.entity.ts';

/** The three of Marlpit Leather; all invented. The password is for the demo workshop alone. */
export const demoPassword = 'marlpit-by-the-fen';

export const people: Pick<Person, 'name' | 'email' | 'role'>[] = [
  { name: 'Ines Okafor-Lund', email: 'owner@example.com', role: 'owner' },
  { name: 'Tobias Wren', email: 'maker@example.com', role: 'maker' },
  { name: 'Maud Achterberg', email: 'bookkeeper@example.com', role: 'bookkeeper' },
];

export const shop = {
  workshopName: 'Marlpit Leather',
  address: 'Marlpit Leather\nThe Old Maltings\nFennbridge',
  taxNumber: 'FB 000 000 000',
  taxRate: { name: 'Sales tax', percent: '6' },
  rates: { minimumWagePerHour: '12', restPercent: '8', overheadPerHour: '4', minimumOrder: '60' },
};
