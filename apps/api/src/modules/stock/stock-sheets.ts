import type { HardwareLevel, StockLevels, StockMovement } from '@hidewright/contract';
import { convert, toAtMost } from '@hidewright/domain';
import type { ListSheet } from '../../papers/list-sheet.ts';
import type { Workshop } from '../workshop/workshop.entity.ts';
import { areaSigns } from './say-area.ts';

type Page = ListSheet['pages'][number];
type Column = Page['columns'][number];
type Cell = string | number | null;

const column = (title: string, kind: Column['kind'], width = 14): Column => ({
  title,
  kind,
  width,
});

const area = (workshop: Workshop, areaMm2: string | null): string | null =>
  areaMm2 === null ? null : toAtMost(convert(areaMm2, 'mm2', workshop.areaUnit), 3);

/** Whoever sees no costs gets no column for them. */
const withValue = (shown: boolean, column: Column) => (shown ? [column] : []);
const valueCell = (shown: boolean, value: string | undefined): Cell[] =>
  shown ? [value ?? null] : [];

const standingWords = ['Held for jobs', 'Free', 'On order', 'Promised of both'];
const standingOf = ({ reserved, free, onOrder, promised }: HardwareLevel['standing']) => [
  reserved,
  free,
  onOrder,
  promised,
];

/** What was there at the end of a day: leather in all and lot by lot, hardware and supplies, and leather that was out. */
export function levelsSheet(workshop: Workshop, levels: StockLevels, values: boolean): ListSheet {
  const unit = areaSigns[workshop.areaUnit];
  const worth = withValue(values, column(`At cost, ${workshop.currency}`, 'money'));
  const leather: Page = {
    name: `Leather ${levels.on}`,
    columns: [
      column('Leather', 'text', 32),
      column('Tag', 'text'),
      column('Form', 'text'),
      column('Place', 'text'),
      column(`On hand, ${unit}`, 'measure'),
      ...worth,
    ],
    rows: levels.leathers.flatMap(({ name, lots }) =>
      lots.map(({ tag, form, place, areaMm2, value }) => [
        name,
        tag,
        form,
        place,
        area(workshop, areaMm2),
        ...valueCell(values, value),
      ]),
    ),
  };
  const inAll: Page = {
    name: `Leather in all ${levels.on}`,
    columns: [
      column('Leather', 'text', 32),
      ...['On hand', ...standingWords].map((word) => column(`${word}, ${unit}`, 'measure')),
      ...worth,
    ],
    rows: levels.leathers.map(({ name, areaMm2, standing, value }) => [
      name,
      ...[areaMm2, ...standingOf(standing)].map((each) => area(workshop, each)),
      ...valueCell(values, value),
    ]),
  };
  const hardware: Page = {
    name: `Hardware ${levels.on}`,
    columns: [
      column('Name', 'text', 32),
      column('Kind', 'text'),
      column('Unit', 'text'),
      column('On hand', 'count'),
      ...standingWords.map((word) => column(word, 'count')),
      ...worth,
    ],
    rows: levels.hardware.map(({ name, kind, unit, quantity, standing, value }) => [
      ...[name, kind, unit, quantity],
      ...standingOf(standing).map(Number),
      ...valueCell(values, value),
    ]),
  };
  const out: Page = {
    name: `Out ${levels.on}`,
    columns: [
      column('Leather', 'text', 32),
      column('Tag', 'text'),
      column('Out for', 'text'),
      column('With', 'text', 32),
      column('Order', 'text'),
      column(`Out, ${unit}`, 'measure'),
      ...worth,
    ],
    rows: levels.out.map((row) => [
      row.leatherName,
      row.tag,
      row.service,
      row.supplierName,
      row.purchaseOrderNumber,
      area(workshop, row.areaMm2),
      ...valueCell(values, row.value),
    ]),
  };
  const pages = [inAll, leather, hardware, ...(levels.out.length === 0 ? [] : [out])];
  return { workshopName: workshop.name, pages };
}

export function movementsSheet(
  workshop: Workshop,
  movements: readonly StockMovement[],
  values: boolean,
): ListSheet {
  const columns = [
    column('Day', 'day'),
    column('What', 'text'),
    column('Tag', 'text'),
    column('Hardware', 'text', 32),
    column(`Area, ${areaSigns[workshop.areaUnit]}`, 'measure'),
    column('Pieces', 'count'),
    ...withValue(values, column(`At cost, ${workshop.currency}`, 'money')),
    column('Job', 'text'),
    column('Order', 'text'),
    column('Why', 'text', 32),
    column('By', 'text', 24),
  ];
  const rows = movements.map((row) => [
    row.day,
    row.kind,
    row.lotTag,
    row.hardwareName,
    area(workshop, row.areaMm2),
    row.quantity,
    ...valueCell(values, row.value),
    row.jobNumber,
    row.purchaseOrderNumber,
    row.reason,
    row.actorName,
  ]);
  return { workshopName: workshop.name, pages: [{ name: 'Movements', columns, rows }] };
}
