import type {
  addTool as addToolEndpoint,
  BodyOf,
  changeTool as changeToolEndpoint,
} from '@hidewright/contract';
import { assignDefined } from '../db/assign-defined.ts';
import { decimals } from '../db/decimals.ts';
import { requireVersion } from '../http/conditions.ts';
import { invalid, type FieldFault } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { Customer } from '../modules/customers/customer.entity.ts';
import { Pattern } from '../modules/patterns/pattern.entity.ts';
import { findTool } from '../modules/tools/find-tool.ts';
import { requireNextState } from '../modules/tools/tool-states.ts';
import { Tool } from '../modules/tools/tool.entity.ts';
import type { Work } from '../work.ts';

/**
 * Adds a cutting die or stamp plate.
 * @throws {Problem} 422 when its number is taken, its metal does not suit its kind, a customer's own names no customer, or its
 * pattern or customer does not exist
 */
export async function addTool(work: Work, asked: BodyOf<typeof addToolEndpoint>): Promise<Tool> {
  const number = asked.number === '' ? await nextNumber(work, asked.kind) : asked.number;
  await requireSound(work, { ...asked, number });
  const { cost, ruleThicknessMm, borderMm, reliefAreaMm2, ...plain } = asked;
  const measures = decimals({ cost, ruleThicknessMm, borderMm, reliefAreaMm2 });
  const tool = work.em.create(Tool, { ...plain, number, ...measures });
  await work.em.flush();
  await logDeed(work, { action: `added ${nameOf(tool)}`, subjectKind: 'tool', subjectId: tool.id });
  return tool;
}

/**
 * Changes a cutting die or stamp plate; its count of uses changes only through its ledger.
 * @throws {Problem} 404, 409 for a state that cannot follow, 412, 422 as for a new one
 */
export async function changeTool(
  work: Work,
  asked: { id: number; ifMatch: number; change: BodyOf<typeof changeToolEndpoint> },
): Promise<Tool> {
  const tool = await findTool(work, asked.id);
  await requireVersion(
    work.em,
    { kind: 'tool', id: tool.id, version: tool.version },
    asked.ifMatch,
  );
  const { cost, ruleThicknessMm, borderMm, reliefAreaMm2, ...plain } = asked.change;
  if (plain.state !== undefined) requireNextState(tool, plain.state);
  await requireSound(work, afterChange(tool, plain));
  const measures = decimals({ cost, ruleThicknessMm, borderMm, reliefAreaMm2 });
  assignDefined(tool, { ...plain, ...measures });
  await work.em.flush();
  const detail = { changed: Object.keys(asked.change), state: tool.state };
  await logDeed(work, {
    action: `changed ${nameOf(tool)}`,
    subjectKind: 'tool',
    subjectId: tool.id,
    detail,
  });
  return tool;
}

const nameOf = ({ kind, number, name }: Tool) => `${kind} ${number}, ${name}`;

/** One more than the highest whole number of its kind. */
async function nextNumber({ em }: Work, kind: Tool['kind']): Promise<string> {
  const tools = await em.find(Tool, { kind }, { fields: ['number'] });
  const numbers = tools.map(({ number }) => (/^\d+$/.test(number) ? Number(number) : 0));
  return String(Math.max(0, ...numbers) + 1);
}

function afterChange(
  tool: Tool,
  change: { [K in keyof Checked]?: Checked[K] | undefined },
): Checked {
  const { id, kind, number, metal, patternId, customerId, ownedBy, keptUntil, state } = tool;
  const checked = { id, kind, number, metal, patternId, customerId, ownedBy, keptUntil, state };
  assignDefined<Checked>(checked, change);
  return checked;
}

type Checked = Pick<
  Tool,
  'kind' | 'number' | 'metal' | 'patternId' | 'customerId' | 'ownedBy' | 'keptUntil' | 'state'
> & { id?: number };

async function requireSound(work: Work, tool: Checked): Promise<void> {
  const faults = [
    ...metalFaults(tool),
    ...termFaults(tool),
    ...(await numberFaults(work, tool)),
    ...(await ownerFaults(work, tool)),
  ];
  if (faults.length > 0) throw invalid(faults);
}

function metalFaults({ kind, metal }: Checked): FieldFault[] {
  if (kind === 'stamp plate' && metal === '') {
    return [{ field: 'metal', message: 'Choose what the plate is made of.' }];
  }
  if (kind === 'cutting die' && metal !== '' && metal !== 'steel') {
    return [
      { field: 'metal', message: 'A cutting die is of steel. Choose steel, or leave it empty.' },
    ];
  }
  return [];
}

function termFaults({ ownedBy, customerId, keptUntil, state }: Checked): FieldFault[] {
  if (ownedBy === 'customer') {
    const message = 'Choose the customer whose tool it is, or make it the shop’s own.';
    return customerId === null ? [{ field: 'customerId', message }] : [];
  }
  if (state === 'returned') {
    const message = 'It was given back, so it stays the customer’s own. Put it on the rack first.';
    return [{ field: 'ownedBy', message }];
  }
  const message = 'Leave the day empty: only a customer’s own tool is kept for a term.';
  return keptUntil === null ? [] : [{ field: 'keptUntil', message }];
}

async function numberFaults({ em }: Work, { id, kind, number }: Checked): Promise<FieldFault[]> {
  const other = await em.findOne(Tool, { kind, number });
  if (other === null || other.id === id) return [];
  return [
    { field: 'number', message: `There is a ${kind} ${number} already. Choose another number.` },
  ];
}

async function ownerFaults(
  { em }: Work,
  { patternId, customerId }: Checked,
): Promise<FieldFault[]> {
  const faults: FieldFault[] = [];
  if (patternId !== null && (await em.findOne(Pattern, patternId)) === null) {
    faults.push({
      field: 'patternId',
      message: 'This pattern is not there. Choose one from the list.',
    });
  }
  if (customerId !== null && (await em.findOne(Customer, customerId)) === null) {
    faults.push({
      field: 'customerId',
      message: 'This customer is not there. Choose one from the list.',
    });
  }
  return faults;
}
