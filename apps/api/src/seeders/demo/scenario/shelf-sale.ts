/** What a shop took off the shelf when it came by. */
export const shelfSale = {
  customer: 'Tern Street Outfitters',
  pattern: 'Zip-pull',
  daysBefore: 9,
  lines: [
    { sort: 'good', quantity: 5, unitPrice: '1.9' },
    { sort: 'seconds', quantity: 6, unitPrice: '1.2' },
  ],
} as const;
