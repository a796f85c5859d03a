import type { Hardware } from '@hidewright/contract';
import { KeyFigures } from '../../../components/key-figures.tsx';
import { countText, moneyText, unitPriceText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

/** The counts, large; then what it costs and who sells it. */
export function HardwareFacts({ hardware }: { hardware: Hardware }) {
  const { currency } = useWorkshop();
  const { unitPrice, valueOnHand } = hardware;
  const prices = [
    ...(unitPrice === undefined
      ? []
      : [{ word: `Price, ${currency}`, figure: unitPriceText(unitPrice) }]),
    ...(valueOnHand === undefined
      ? []
      : [{ word: `On hand at cost, ${currency}`, figure: moneyText(valueOnHand) }]),
  ];
  return (
    <div className="space-y-5">
      <KeyFigures
        large
        figures={[
          { word: 'On hand', figure: countText(hardware.onHand) },
          { word: 'Held for jobs', figure: countText(hardware.reserved) },
          { word: 'Free', figure: countText(hardware.free) },
          { word: 'On order', figure: countText(hardware.onOrder) },
        ]}
      />
      <KeyFigures
        figures={[
          { word: 'Keep at least', figure: countText(hardware.reorderAt) },
          { word: 'In packs of', figure: countText(hardware.packSize) },
          { word: 'Supplier', figure: hardware.supplierName ?? '–' },
          ...prices,
        ]}
      />
    </div>
  );
}
