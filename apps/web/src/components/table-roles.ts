/**
 * On a phone the rows are drawn as cards, and a table that is not displayed as one loses its meaning to the ear
 * unless its roles are said.
 */
export const tableRoles = {
  table: { role: 'table' },
  group: { role: 'rowgroup' },
  row: { role: 'row' },
  header: { role: 'columnheader' },
  cell: { role: 'cell' },
} as const;
