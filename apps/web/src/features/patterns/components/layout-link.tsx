import { patternLayoutPdf } from '@hidewright/contract';
import { buttonLook } from '../../../components/button-look.ts';
import { addressOf } from '../../../lib/api.ts';

/** The layout on a sheet, for the wall beside the press. */
export function LayoutLink({ patternId }: { patternId: number }) {
  return (
    <p className="no-print mt-4">
      <a
        href={addressOf(patternLayoutPdf, { params: { id: patternId } })}
        download
        className={buttonLook({})}
      >
        Layout to print (PDF)
      </a>
    </p>
  );
}
