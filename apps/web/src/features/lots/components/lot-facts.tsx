import type { Lot, OutFor } from '@hidewright/contract';
import { KeyFigures } from '../../../components/key-figures.tsx';
import { Notice } from '../../../components/notice.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { rackAreaText, dayText, moneyText } from '../../../lib/formatting.ts';
import { weightText } from '../../../lib/weight-words.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

const given = (text: string) => (text === '' ? '–' : text);

/** What is left of a lot, large; then where it lies and where it came from. */
export function LotFacts({ lot }: { lot: Lot }) {
  const workshop = useWorkshop();
  const { currency, today } = workshop;
  const area = (areaMm2: string) => rackAreaText(areaMm2, workshop);
  const costs = [
    { word: `Cost, ${currency}`, figure: lot.cost },
    { word: `Left at cost, ${currency}`, figure: lot.valueOnHand },
  ].flatMap(({ word, figure }) =>
    figure === undefined ? [] : [{ word, figure: moneyText(figure) }],
  );
  return (
    <div className="space-y-5">
      <KeyFigures
        large
        figures={[
          {
            word: 'On hand',
            figure: area(lot.onHandAreaMm2),
            note: `of ${area(lot.measuredAreaMm2)} measured`,
          },
          { word: 'Held for jobs', figure: area(lot.reservedAreaMm2) },
          { word: 'Free', figure: area(lot.freeAreaMm2) },
        ]}
      />
      {lot.outFor.map((out) => (
        <OutNotice key={`${out.purchaseOrderId} ${out.areaMm2}`} out={out} />
      ))}
      <KeyFigures
        figures={[
          {
            word: 'Leather',
            figure: (
              <TextLink to={`/stockroom/leather/${lot.leatherId}`}>{lot.leatherName}</TextLink>
            ),
          },
          {
            word: 'Weight',
            figure: given(weightText({ weightLowOz: lot.weightOz, weightHighOz: null })),
          },
          { word: 'Place', figure: given(lot.place) },
          { word: 'Shade', figure: given(lot.shade) },
          { word: 'Grade', figure: given(lot.grade) },
          { word: 'Supplier’s lot', figure: given(lot.supplierLot) },
          {
            word: lot.form === 'offcut' ? 'Its leather came on' : 'Received',
            figure: dayText(lot.receivedOn, today),
          },
          { word: 'Order', figure: <OrderLink lot={lot} /> },
          ...costs,
        ]}
      />
    </div>
  );
}

/** 24.8 ft² out for dyeing at Fen Dye Works, P-0012, awaited Wed 9 Dec */
function OutNotice({ out }: { out: OutFor }) {
  const workshop = useWorkshop();
  const { areaMm2, service, supplierName, expectedOn, becomesName } = out;
  const late = expectedOn !== null && expectedOn < workshop.today;
  return (
    <Notice
      tone={late ? 'attention' : 'info'}
      title={`${rackAreaText(areaMm2, workshop)} out for ${service}`}
    >
      at {supplierName},{' '}
      <TextLink to={`/stockroom/purchase-orders/${out.purchaseOrderId}`}>
        {out.purchaseOrderNumber}
      </TextLink>
      {expectedOn !== null &&
        `, ${late ? 'late: was awaited' : 'awaited'} ${dayText(expectedOn, workshop.today)}`}
      {`. It becomes ${becomesName}.`}
    </Notice>
  );
}

function OrderLink({ lot }: { lot: Lot }) {
  if (lot.purchaseOrderId === null) return '–';
  return (
    <TextLink to={`/stockroom/purchase-orders/${lot.purchaseOrderId}`}>
      {lot.purchaseOrderNumber}
    </TextLink>
  );
}
