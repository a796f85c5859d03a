import type { Router } from 'express';
import { patternLayoutPdf, patternTemplatePdf, patternTemplateSvg } from '@hidewright/contract';
import { templateSvg } from '@hidewright/domain';
import type { Context } from '../../context.ts';
import { serveFile } from '../../http/serve.ts';
import { layoutFor } from '../layouts/stored-layouts.ts';
import { Workshop } from '../workshop/workshop.entity.ts';
import { layoutPaperOf } from './pattern-layout-paper.ts';
import { templateOf } from './pattern-template.ts';
import { definitionOf, findPattern, latestVersion } from './pattern-versions.ts';

/** What a pattern has to print: its outline true to size, as a drawing and on sheets, and its layout. */
export function patternPaperRoutes(router: Router, context: Context): void {
  serveFile(router, context, patternTemplateSvg, async (work, { params, query }) => {
    const { outline, patternName } = await templateOf(work, params.id, query.safeMarginMm);
    const svg = templateSvg(outline, { name: patternName, safeMarginMm: query.safeMarginMm });
    const bytes = new TextEncoder().encode(svg);
    return { name: `${patternName} template.svg`, type: 'image/svg+xml', bytes };
  });

  serveFile(router, context, patternLayoutPdf, async (work, { params }) => {
    const pattern = await findPattern(work, params.id);
    const definition = definitionOf(await latestVersion(work, pattern));
    const { layout } = await layoutFor(context, definition);
    const { name: shopName } = await work.em.findOneOrFail(Workshop, 1);
    const laid = { shopName, patternName: pattern.name, definition, layout, day: work.today };
    const bytes = await context.papers.layout(layoutPaperOf(laid));
    return { name: `${pattern.name} layout.pdf`, type: 'application/pdf', bytes };
  });

  serveFile(router, context, patternTemplatePdf, async (work, { params, query }) => {
    const template = await templateOf(work, params.id, query.safeMarginMm);
    const bytes = await context.papers.template(template);
    return { name: `${template.patternName} template.pdf`, type: 'application/pdf', bytes };
  });
}
