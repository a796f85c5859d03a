import { useQuery } from '@tanstack/react-query';
import { Card } from '../../../components/card.tsx';
import { KeyFigures } from '../../../components/key-figures.tsx';
import { countText } from '../../../lib/formatting.ts';
import { levelsQuery } from '../stock.queries.ts';

/** How one hardware stands: what is free now and on order, what of both open jobs still need, and what that leaves. */
export function StandingCard({ hardwareId }: { hardwareId: number }) {
  const { data } = useQuery(levelsQuery({ hardwareId }));
  const [level] = data?.hardware ?? [];
  if (level === undefined) return null;
  const { free, onOrder, promised } = level.standing;
  const there = Number(free) + Number(onOrder);
  const left = there - Number(promised);
  return (
    <Card title="Left to promise">
      <KeyFigures
        figures={[
          { word: 'Free and on order', figure: countText(there) },
          {
            word: 'Promised of it',
            figure: countText(Number(promised)),
            note: 'what open jobs need and is not held for them',
          },
          left < 0
            ? { word: 'Missing', figure: countText(-left), note: 'order as many more' }
            : { word: 'Left', figure: countText(left) },
        ]}
      />
    </Card>
  );
}
