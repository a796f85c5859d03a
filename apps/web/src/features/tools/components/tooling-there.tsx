import { useQuery } from '@tanstack/react-query';
import { Card } from '../../../components/card.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { toolingAdviceQuery, type AskedTooling } from '../tools.queries.ts';

/** Beside what a quote charges for tooling: the die and plate that are there already, and so need not be charged. */
export function ToolingThere(asked: AskedTooling) {
  const { data } = useQuery(toolingAdviceQuery(asked));
  if (!data || data.tools.length === 0) return null;
  const { patternId, customerId, pieces } = asked;
  const whose = customerId === undefined ? '' : `&customerId=${customerId}`;
  return (
    <Card
      title="Tooling there is"
      aside={
        <TextLink to={`/pattern-room/patterns/${patternId}/tooling?pieces=${pieces}${whose}`}>
          Which metal
        </TextLink>
      }
    >
      <ul className="space-y-2">
        {data.tools.map(({ kind, sentence }) => (
          <li key={kind}>{sentence}</li>
        ))}
      </ul>
    </Card>
  );
}
