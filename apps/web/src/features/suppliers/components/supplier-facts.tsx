import type { Supplier } from '@hidewright/contract';
import { KeyFigures } from '../../../components/key-figures.tsx';
import { countText } from '../../../lib/formatting.ts';

/** How to reach a supplier, for those who do not change it. */
export function SupplierFacts({ supplier }: { supplier: Supplier }) {
  const given = (text: string) => (text === '' ? '–' : text);
  return (
    <div className="space-y-5">
      <KeyFigures
        figures={[
          { word: 'E-mail address', figure: given(supplier.email) },
          { word: 'Phone', figure: given(supplier.phone) },
          { word: 'Delivers within', figure: `${countText(supplier.leadDays)} days` },
        ]}
      />
      {supplier.note !== '' && <p className="whitespace-pre-line">{supplier.note}</p>}
    </div>
  );
}
