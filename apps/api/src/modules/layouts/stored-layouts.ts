import { createHash } from 'node:crypto';
import {
  handCount,
  layoutInputKey,
  outlinePath,
  type Layout,
  type LayoutInput,
  type SideInput,
  type SideLayout,
} from '@hidewright/domain';
import {
  layoutSourceOf,
  outlineOf,
  type LayoutAsked,
  type LayoutSource,
  type StoredLayoutReply,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { invalid, notFound } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { StoredLayout } from './layout.entity.ts';

/** A layout that is known but perhaps not kept yet. */
export interface Worked<Source, Laid> {
  inputHash: string;
  source: Source;
  layout: Laid;
}
export type WorkedLayout = Worked<LayoutSource, Layout>;

/** Who finds layouts, and works out those that are not known. */
type Layer = Pick<Context, 'orm' | 'workers'>;

/** Finds a layout by what goes into it. */
export function layoutHash(asked: LayoutAsked): string {
  return hashOf(layoutSourceOf(asked));
}

/**
 * The layout for a pattern's definition (or any request for one): found by the hash of its input, or else worked
 * out by a worker. Belongs into an endpoint's `prepare`, outside the transaction; `keepLayout` then stores it.
 */
export async function layoutFor(context: Layer, asked: LayoutAsked): Promise<WorkedLayout> {
  const [worked] = await layoutsFor(context, [asked]);
  return worked as WorkedLayout;
}

/** Those for several at once, in their order; what is asked for twice is found or worked out once. */
export function layoutsFor(context: Layer, asked: readonly LayoutAsked[]): Promise<WorkedLayout[]> {
  return workedOnce(
    context,
    asked.map((each) => {
      const source = layoutSourceOf(each);
      const workOut = async () =>
        source.by === 'outline'
          ? await context.workers.layOut(source.input)
          : handCount(source.counted);
      return { source, inputHash: hashOf(source), workOut };
    }),
  );
}

/** The layout of a strip without an end, found or worked out in the same way. */
export async function stripLayoutFor(context: Layer, input: LayoutInput): Promise<WorkedLayout> {
  const source = { by: 'outline' as const, input };
  const workOut = () => context.workers.layOut(input);
  const [worked] = await workedOnce(context, [{ source, inputHash: hashOf(source), workOut }]);
  return worked as WorkedLayout;
}

/**
 * The layout of pieces on a drawn side, found or worked out in the same way.
 * @param workOut how, where it is not known: by a worker, unless said
 */
export async function sideLayoutFor(
  context: Layer,
  input: SideInput,
  workOut: () => Promise<SideLayout> = () => context.workers.layOutSide(input),
): Promise<Worked<SideInput, SideLayout>> {
  const inputHash = sha256(layoutInputKey(input));
  const [worked] = await workedOnce(context, [{ source: input, inputHash, workOut }]);
  return worked as Worked<SideInput, SideLayout>;
}

/** Pieces of the layouts on drawn sides that are kept, by the key of what they were asked. */
export async function piecesBySideInput(
  em: Work['em'],
  keys: readonly string[],
): Promise<Map<string, number>> {
  const keyOf = new Map(keys.map((key) => [sha256(key), key]));
  const kept = await em.find(
    StoredLayout,
    { inputHash: { $in: [...keyOf.keys()] } },
    { fields: ['inputHash', 'pieces'] },
  );
  return new Map(kept.map(({ inputHash, pieces }) => [keyOf.get(inputHash) ?? '', pieces]));
}

interface ToWork<Source, Laid> {
  source: Source;
  inputHash: string;
  workOut: () => Promise<Laid>;
}

async function workedOnce<Source, Laid>(
  { orm }: Pick<Context, 'orm'>,
  asked: readonly ToWork<Source, Laid>[],
): Promise<Worked<Source, Laid>[]> {
  // What went in may be as long as the layout, and is at hand.
  const stored = await orm.em.execute<{ hash: string; result: string }[]>(
    `SELECT input_hash AS hash, result FROM layout WHERE input_hash IN (SELECT value FROM json_each(?))`,
    [JSON.stringify(asked.map(({ inputHash }) => inputHash))],
  );
  const layouts = new Map<string, Laid | Promise<Laid>>(
    stored.map(({ hash, result }) => [hash, JSON.parse(result) as Laid]),
  );
  for (const { inputHash, workOut } of asked)
    if (!layouts.has(inputHash)) layouts.set(inputHash, workOut());
  return Promise.all(
    asked.map(async ({ source, inputHash }) => ({
      source,
      inputHash,
      layout: (await layouts.get(inputHash)) as Laid,
    })),
  );
}

/** A layout of any kind, as far as keeping it goes. */
export type LayoutToKeep = Worked<unknown, { pieces: number }>;

/** Stores a layout once, in the transaction that uses it; the same input finds the same row. */
export async function keepLayout(
  work: Pick<Work, 'em' | 'now'>,
  worked: LayoutToKeep,
): Promise<StoredLayout> {
  const { inputHash, source, layout } = worked;
  const stored = await work.em.findOne(StoredLayout, { inputHash });
  if (stored !== null) return stored;
  const created = work.em.create(StoredLayout, {
    inputHash,
    input: source,
    result: layout,
    pieces: layout.pieces,
    createdAt: work.now.toISOString(),
  });
  await work.em.flush();
  return created;
}

/** The same where only its number is wanted: a layout of many pieces is long to read. */
export async function keepLayoutId(
  work: Pick<Work, 'em' | 'now'>,
  worked: LayoutToKeep,
): Promise<number> {
  const [stored] = await work.em.execute<{ id: number }[]>(
    'SELECT id FROM layout WHERE input_hash = ?',
    [worked.inputHash],
  );
  return stored?.id ?? (await keepLayout(work, worked)).id;
}

/** @throws {Problem} 404 */
export async function findLayout(em: Work['em'], id: number): Promise<StoredLayout> {
  const stored = await em.findOne(StoredLayout, id);
  if (stored === null) throw notFound('layout');
  return stored;
}

/** Refuses to price or to make what no leather gives: the layout says honestly that nothing fits. */
export function requirePieces(layout: Layout, field = 'patternId'): void {
  if (layout.pieces > 0) return;
  const message =
    'Not one piece fits on the panel or strip of this pattern. Make the panel larger or the outline smaller.';
  throw invalid([{ field, message }]);
}

/** The drawing of what was laid out; none for a hand count. */
export function pathOf(stored: Pick<StoredLayout, 'input'>): string | null {
  const source = stored.input as LayoutSource;
  return source.by === 'outline' ? outlinePath(source.input.outline) : null;
}

/** The drawing of a pattern's outline, also where a hand count drives its layout. */
export function pathOfDefinition(definition: Pick<LayoutAsked, 'outline'>): string | null {
  return definition.outline === null ? null : outlinePath(outlineOf(definition.outline));
}

export function layoutReply(stored: StoredLayout): StoredLayoutReply {
  return { id: stored.id, layout: stored.result as Layout, outlinePath: pathOf(stored) };
}

function hashOf(source: LayoutSource): string {
  const key =
    source.by === 'outline'
      ? layoutInputKey(source.input)
      : `hand count ${JSON.stringify(source.counted)}`;
  return sha256(key);
}

const sha256 = (key: string) => createHash('sha256').update(key).digest('hex');
