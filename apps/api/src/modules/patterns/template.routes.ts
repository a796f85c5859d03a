import type { Router } from 'express';
import { patternTemplatePdf, patternTemplateSvg } from '@hidewright/contract';
import { templateSvg } from '@hidewright/domain';
import type { Context } from '../../context.ts';
import { serveFile } from '../../http/serve.ts';
import { templateOf } from './pattern-template.ts';

/** The outline true to size: a drawing for artwork, and sheets to print. */
export function templateRoutes(router: Router, context: Context): void {
  serveFile(router, context, patternTemplateSvg, async (work, { params, query }) => {
    const { outline, patternName } = await templateOf(work, params.id, query.safeMarginMm);
    const svg = templateSvg(outline, { name: patternName, safeMarginMm: query.safeMarginMm });
    const bytes = new TextEncoder().encode(svg);
    return { name: `${patternName} template.svg`, type: 'image/svg+xml', bytes };
  });

  serveFile(router, context, patternTemplatePdf, async (work, { params, query }) => {
    const template = await templateOf(work, params.id, query.safeMarginMm);
    const bytes = await context.papers.template(template);
    return { name: `${template.patternName} template.pdf`, type: 'application/pdf', bytes };
  });
}
