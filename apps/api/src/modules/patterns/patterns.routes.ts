import { Router } from 'express';
import {
  addPattern as addPatternEndpoint,
  adviseCut as adviseCutEndpoint,
  changePattern as changePatternEndpoint,
  listPatterns as listPatternsEndpoint,
  listPatternVersions,
  readPattern,
  readToolingAdvice,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { adviseCut, type WorkedAdvice } from '../../flows/advice/advise-cut.ts';
import { adviseTooling } from '../../flows/advice/advise-tooling.ts';
import { addPattern, changePattern } from '../../flows/save-pattern.ts';
import { readCursor, toPage } from '../../http/paging.ts';
import { serve } from '../../http/serve.ts';
import type { Work } from '../../work.ts';
import { keepLayout, layoutFor, type WorkedLayout } from '../layouts/stored-layouts.ts';
import { PatternVersion } from './pattern-version.entity.ts';
import { definitionOf, findPattern, latestVersion } from './pattern-versions.ts';
import type { Pattern } from './pattern.entity.ts';
import { describePattern, listPatterns, summarise } from './patterns.repository.ts';
import { patternPaperRoutes } from './pattern-papers.routes.ts';

export function patternRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, listPatternsEndpoint, async (work, { query }) => {
    const { q, limit } = query;
    const active = query.active === undefined ? undefined : query.active === 'yes';
    const rows = await listPatterns(work, { below: readCursor(query.cursor), q, active, limit });
    const { items, next } = toPage(rows, limit, (row) => row.id);
    return { items: await summarise(work, items), next };
  });

  serve(
    router,
    context,
    readPattern,
    async (work, { params }, { version, worked }: Current) =>
      describePattern(work, await findPattern(work, params.id), version, worked.layout),
    ({ params }) => asItIs(context, params.id),
  );

  serve(router, context, listPatternVersions, async (work, { params }) => {
    const { id } = await findPattern(work, params.id);
    const versions = await work.em.find(
      PatternVersion,
      { patternId: id },
      { orderBy: { number: 'desc' } },
    );
    return { items: versions.map(toVersion) };
  });

  patternPaperRoutes(router, context);

  serve(
    router,
    context,
    addPatternEndpoint,
    async (work, { body }, worked: WorkedLayout) =>
      reply(work, await addPattern(work, body, worked), worked),
    ({ body }) => layoutFor(context, body.definition),
  );

  serve(
    router,
    context,
    changePatternEndpoint,
    async (work, { params, body, ifMatch }, worked: WorkedLayout) => {
      const pattern = await changePattern(work, { id: params.id, ifMatch, change: body }, worked);
      return reply(work, pattern, worked);
    },
    async ({ params, body }) => {
      if (body.definition !== undefined) return layoutFor(context, body.definition);
      return (await asItIs(context, params.id)).worked;
    },
  );

  serve(
    router,
    context,
    adviseCutEndpoint,
    async (work, _asked, { reply: advice, compared }: WorkedAdvice) => {
      for (const worked of compared) await keepLayout(work, worked);
      return advice;
    },
    ({ params, body }) => adviseCut(context, params.id, body),
  );

  serve(router, context, readToolingAdvice, (work, { params, query }) =>
    adviseTooling(work, params.id, query),
  );

  return router;
}

function toVersion(version: PatternVersion) {
  const { number, createdAt, createdBy } = version;
  return { number, definition: definitionOf(version), createdAt, createdBy };
}

async function reply(work: Work, pattern: Pattern, { layout }: WorkedLayout) {
  return describePattern(work, pattern, await latestVersion(work, pattern), layout);
}

interface Current {
  version: PatternVersion;
  worked: WorkedLayout;
}

/** The latest version with its layout, worked out again where the way of laying out has become better since. */
async function asItIs(context: Context, patternId: number): Promise<Current> {
  const reader = { em: context.orm.em.fork() };
  const version = await latestVersion(reader, await findPattern(reader, patternId));
  return { version, worked: await layoutFor(context, definitionOf(version)) };
}
