import { useQuery } from '@tanstack/react-query';
import { Card } from '../../../components/card.tsx';
import { KeyFigures } from '../../../components/key-figures.tsx';
import { countText } from '../../../lib/formatting.ts';
import { levelsQuery } from '../stock.queries.ts';

/** How one hardware stands: on the shelf, held, free, and what of the next delivery is promised already. */
export function StandingCard({ hardwareId }: { hardwareId: number }) {
  const { data } = useQuery(levelsQuery({ hardwareId }));
  const [level] = data?.hardware ?? [];
  if (level === undefined) return null;
  const { onOrder, promised } = level.standing;
  const still = Number(onOrder) - Number(promised);
  return (
    <Card title="Still to come">
      <KeyFigures
        figures={[
          { word: 'On order', figure: countText(Number(onOrder)) },
          {
            word: 'Promised of it',
            figure: countText(Number(promised)),
            note: 'what open jobs need and the shelf does not hold',
          },
          still < 0
            ? { word: 'Missing', figure: countText(-still), note: 'order as many more' }
            : { word: 'Left of it', figure: countText(still) },
        ]}
      />
    </Card>
  );
}
