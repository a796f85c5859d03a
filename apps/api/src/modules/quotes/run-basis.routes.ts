import type { Router } from 'express';
import { quoteTerms, readRunBasis } from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { layPattern, type LaidPattern } from '../../flows/lay-pattern.ts';
import { hardwareKinds, optionsOf } from '../../flows/run-hardware.ts';
import { runInputFor } from '../../flows/run-input.ts';
import { notFound } from '../../http/problem.ts';
import { serve } from '../../http/serve.ts';
import { pathOf } from '../layouts/stored-layouts.ts';

/** One rung, so that the input is whole before anything is typed. */
const example = {
  breaks: [{ quantity: 100, typedPrice: null, rule: null }],
  tooling: [],
  overrides: {},
  terms: quoteTerms.parse({}),
};

/** What the page prices a run from while it is typed: the same input that a saved quote would get. */
export function runBasisRoute(router: Router, context: Context): void {
  serve(
    router,
    context,
    readRunBasis,
    async (work, _asked, laid: LaidPattern) => ({
      patternId: laid.patternId,
      patternName: laid.patternName,
      patternVersion: laid.versionNumber,
      layout: laid.worked.layout,
      outlinePath: pathOf({ input: laid.worked.source }),
      needsDie: laid.definition.needsDie,
      needsPlate: laid.definition.needsPlate,
      options: optionsOf(laid.definition, await hardwareKinds(work, laid.definition)),
      input: await runInputFor(work, laid.definition, laid.worked.layout, example),
    }),
    ({ params }) => layPattern(context, params.id, notFound('pattern')),
  );
}
