import type { Today } from '@hidewright/contract';
import { BarList } from '../../../components/bar-list.tsx';
import { Card } from '../../../components/card.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { useWorkshop } from '../../../lib/workshop.tsx';

/** What customers owe, by how long it has been due. */
export function Owed({ owed }: { owed: NonNullable<Today['owed']> }) {
  const { currency } = useWorkshop();
  return (
    <Card
      title="Owed to us"
      subtitle={`by age, ${currency}`}
      aside={<TextLink to="/books">Books</TextLink>}
    >
      <BarList
        label="Owed to us by age"
        bars={owed.map(({ age, amount }) => ({
          label: age,
          value: Number(amount),
          shown: amount,
          tone: age === 'not due' ? 'info' : 'attention',
        }))}
      />
    </Card>
  );
}
