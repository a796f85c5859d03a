import { patternTemplatePdf, patternTemplateSvg } from '@hidewright/contract';
import { buttonLook } from '../../../components/button-look.ts';
import { addressOf } from '../../../lib/api.ts';

/** The outline true to size: sheets to print, and a drawing for the customer's artwork. */
export function TemplateLinks({ patternId }: { patternId: number }) {
  const asked = { params: { id: patternId } };
  return (
    <div className="no-print mb-5 space-y-1.5">
      <div className="flex flex-wrap gap-2">
        <a href={addressOf(patternTemplatePdf, asked)} download className={buttonLook({})}>
          Template to print (PDF)
        </a>
        <a href={addressOf(patternTemplateSvg, asked)} download className={buttonLook({})}>
          Template for artwork (SVG)
        </a>
      </div>
      <p className="text-sm text-ink-soft">True to size, with a ruler to check the print by.</p>
    </div>
  );
}
