import { useQuery } from '@tanstack/react-query';
import { Card } from '../../../components/card.tsx';
import { KeyFigures } from '../../../components/key-figures.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { minutesText, percentText } from '../../../lib/formatting.ts';
import { minutesBehind, rejectsBehind } from '../learned-words.ts';
import { learnedQuery } from '../learned.queries.ts';

interface LearnedCardProps {
  patternId: number;
  isOwner: boolean;
}

/** What the last runs of a pattern say, in two figures, with the way to all of them. */
export function LearnedCard({ patternId, isOwner }: LearnedCardProps) {
  const { data } = useQuery(learnedQuery(patternId));
  if (!data) return null;
  const { minutes, rejects, runs } = data;
  return (
    <Card
      title="What the last runs say"
      aside={
        runs.length > 0 && (
          <TextLink to={`/pattern-room/patterns/${patternId}/learned`}>
            {isOwner ? 'Compare and use them' : 'Run by run'}
          </TextLink>
        )
      }
    >
      {runs.length === 0 ? (
        <p className="text-ink-soft">
          Nothing yet. Once a job of it is finished, its minutes and rejects stand here for the next
          estimate.
        </p>
      ) : (
        <KeyFigures
          figures={[
            {
              word: 'minutes per 100 cut',
              figure: minutes.found ? minutesText(minutes.found.per100) : 'not logged',
              note: minutes.found && minutesBehind(minutes.found),
            },
            {
              word: 'rejects',
              figure: rejects.found ? percentText(rejects.found.percent) : 'not counted',
              note: rejects.found && rejectsBehind(rejects.found),
            },
          ]}
        />
      )}
    </Card>
  );
}
