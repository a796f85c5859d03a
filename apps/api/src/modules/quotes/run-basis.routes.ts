import type { Router } from 'express';
import { readRunBasis } from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { layPattern, type LaidPattern } from '../../flows/lay-pattern.ts';
import { runAsItStands } from '../../flows/run-input.ts';
import { notFound } from '../../http/problem.ts';
import { serve } from '../../http/serve.ts';
import { definitionFor, describeDesign } from '../designs/read-designs.ts';
import { pathOf } from '../layouts/stored-layouts.ts';

/** What the page prices a run from while it is typed: the same input that a saved quote would get. */
export function runBasisRoute(router: Router, context: Context): void {
  serve(
    router,
    context,
    readRunBasis,
    async (work, { query }, laid: LaidPattern) => {
      const { patternId } = laid;
      const { definition, design } = await definitionFor(work.em, laid.definition, {
        patternId,
        customerId: query.customerId ?? null,
      });
      return {
        patternId,
        design: design === null ? null : await describeDesign(work.em, design),
        patternName: laid.patternName,
        patternVersion: laid.versionNumber,
        layout: laid.worked.layout,
        outlinePath: pathOf({ input: laid.worked.source }),
        needsDie: laid.definition.needsDie,
        needsPlate: laid.definition.needsPlate,
        ...(await runAsItStands(work, { definition, layout: laid.worked.layout })),
      };
    },
    ({ params }) => layPattern(context, params.id, notFound('pattern')),
  );
}
