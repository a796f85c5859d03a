/** Invented customers; the numbers are from a range kept for fiction. */
export const customers = [
  {
    name: 'The Copper Heron',
    contactName: 'Juno Tallis',
    email: 'desk@copper-heron.example.com',
    phone: '555-0101',
    address: 'Quay Lane\nFennbridge',
  },
  {
    name: 'Quillfeather Books',
    contactName: 'Anselm Roe',
    email: 'orders@quillfeather.example.com',
    phone: '555-0102',
    address: 'Market Row\nFennbridge',
  },
  {
    name: 'Saltmarsh Rowing Club',
    contactName: 'Petra Holm',
    email: 'secretary@saltmarsh-rowing.example.com',
    phone: '555-0103',
    address: 'The Boathouse\nSaltmarsh',
  },
  {
    name: 'Brambling Brewery',
    contactName: 'Oskar Finch',
    email: 'taproom@brambling.example.com',
    phone: '555-0104',
    address: 'Mill Yard\nFennbridge',
  },
  {
    name: 'Odalys & Pim',
    contactName: 'Odalys Verne',
    email: 'wedding@odalys-pim.example.com',
    phone: '555-0105',
    address: 'Rose Cottage\nNether Fenn',
  },
  {
    name: 'Tern Street Outfitters',
    contactName: 'Bram Soule',
    email: 'buying@tern-street.example.com',
    phone: '555-0106',
    address: '4 Tern Street\nFennbridge',
  },
] as const;

export type CustomerName = (typeof customers)[number]['name'];
