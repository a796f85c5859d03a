import type { LedgerSubject } from '../../../features/stock/components/only-of.tsx';
import { hardwareQuery } from '../../../features/hardware/hardware.queries.ts';
import { jobQuery } from '../../../features/jobs/jobs.queries.ts';
import { leatherQuery } from '../../../features/leathers/leathers.queries.ts';
import { lotQuery } from '../../../features/lots/lots.queries.ts';
import { orderQuery } from '../../../features/orders/orders.queries.ts';
import { purchaseOrderQuery } from '../../../features/purchase-orders/purchase-orders.queries.ts';
import type { Asked } from '../../../features/stock/stock.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';

interface SubjectKind {
  field: 'lotId' | 'hardwareId' | 'leatherId' | 'jobId' | 'orderId' | 'purchaseOrderId';
  /** What it is called where its own name may not be read. */
  word: string;
  place: (id: number) => string;
  name: (id: number) => Promise<string>;
}

const named = ({ name }: { name: string }) => name;
const numbered = ({ number }: { number: string }) => number;

/** What the ledger can be read for alone, by its name in the address. */
const kinds: Record<string, SubjectKind> = {
  lot: {
    field: 'lotId',
    word: 'one lot',
    place: (id) => `/stockroom/lots/${id}`,
    name: async (id) => `lot ${(await queryClient.ensureQueryData(lotQuery(id))).tag}`,
  },
  hardware: {
    field: 'hardwareId',
    word: 'one bin',
    place: (id) => `/stockroom/hardware/${id}`,
    name: async (id) => named(await queryClient.ensureQueryData(hardwareQuery(id))),
  },
  leather: {
    field: 'leatherId',
    word: 'one leather',
    place: (id) => `/stockroom/leather/${id}`,
    name: async (id) => named(await queryClient.ensureQueryData(leatherQuery(id))),
  },
  job: {
    field: 'jobId',
    word: 'one ticket',
    place: (id) => `/bench/jobs/${id}`,
    name: async (id) => `ticket ${numbered(await queryClient.ensureQueryData(jobQuery(id)))}`,
  },
  order: {
    field: 'orderId',
    word: 'one order',
    place: (id) => `/counter/orders/${id}`,
    name: async (id) => `order ${numbered(await queryClient.ensureQueryData(orderQuery(id)))}`,
  },
  purchase: {
    field: 'purchaseOrderId',
    word: 'one purchase order',
    place: (id) => `/stockroom/purchase-orders/${id}`,
    name: async (id) => numbered(await queryClient.ensureQueryData(purchaseOrderQuery(id))),
  },
};

interface Found {
  param: string;
  kind: SubjectKind;
  id: number;
}

function found(search: URLSearchParams): Found | undefined {
  for (const [param, kind] of Object.entries(kinds)) {
    const id = Number(search.get(param));
    if (Number.isInteger(id) && id > 0) return { param, kind, id };
  }
  return undefined;
}

/** What the ledger is asked for alone, as the API and the address know it. */
export function askedSubject(search: URLSearchParams): { asked: Asked; kept: [string, string][] } {
  const subject = found(search);
  if (subject === undefined) return { asked: {}, kept: [] };
  const { param, kind, id } = subject;
  return { asked: { [kind.field]: id }, kept: [[param, String(id)]] };
}

/** Its name and place; who may not read it sees what kind of thing it is. */
export async function readSubject(search: URLSearchParams): Promise<LedgerSubject | null> {
  const subject = found(search);
  if (subject === undefined) return null;
  const { kind, id } = subject;
  return kind.name(id).then(
    (name) => ({ name, place: kind.place(id) }),
    () => ({ name: kind.word, place: null }),
  );
}
