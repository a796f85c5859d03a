import type { HardwareUnit } from '@hidewright/domain';
import { Card } from '../../../components/card.tsx';
import { AdjustForm } from '../../../features/stock/components/adjust-form.tsx';
import { StandingCard } from '../../../features/stock/components/standing-card.tsx';
import { HeldList } from '../../../features/stock/components/held-list.tsx';

interface HeldAndAdjustProps {
  item: { lotId: number } | { hardwareId: number };
  /** What is on hand as the page shows it: mm² of a lot, else a count. */
  onHand: string | number;
  /** What one of the hardware is. */
  unit?: HardwareUnit;
  /** Whether the person works with the stock, and may enter the bench. */
  handlesStock: boolean;
}

/** Beside a lot or a hardware: which jobs it is held for, and setting it to what is really there. */
export function HeldAndAdjust({ item, onHand, unit, handlesStock }: HeldAndAdjustProps) {
  return (
    <>
      {'hardwareId' in item && <StandingCard hardwareId={item.hardwareId} />}
      <Card title="Held for jobs">
        <HeldList item={item} mayOpenJobs={handlesStock} />
      </Card>
      {handlesStock && (
        <Card title="Adjust" subtitle="to what is really there">
          <AdjustForm
            key={JSON.stringify(item)}
            onHand={onHand}
            unit={unit}
            item={'lotId' in item ? { of: 'lot', ...item } : { of: 'hardware', ...item }}
          />
        </Card>
      )}
    </>
  );
}
