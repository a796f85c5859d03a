import { useQuery } from '@tanstack/react-query';
import { useWatch } from 'react-hook-form';
import { DayField } from '../../../components/day-field.tsx';
import { RadioCards } from '../../../components/radio-cards.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { customerChoicesQuery } from '../tools.queries.ts';

const owners = [
  { value: 'shop', label: 'The shop’s own' },
  { value: 'customer', label: 'The customer’s own', detail: 'kept for a term, then given back' },
];

/** For which customer a tool is, whose it is, and until when a customer's own is kept. */
export function OwnerFields() {
  const { data: customers = [] } = useQuery(customerChoicesQuery());
  const isTheirs = useWatch({ name: 'ownedBy' }) === 'customer';
  return (
    <>
      <RadioCards name="ownedBy" label="Whose it is" cards={owners} across />
      <SelectField
        key={`customers ${customers.length}`}
        name="customerId"
        label="Customer"
        optional={!isTheirs}
        placeholder={isTheirs ? 'Choose whose it is' : 'Nobody in particular'}
        whenEmpty="null"
        choices={customers}
        help={isTheirs ? undefined : 'It then serves this customer’s runs only.'}
      />
      {isTheirs && (
        <DayField
          name="keptUntil"
          label="Kept until"
          optional
          whenEmpty="null"
          help="On that day Today asks you to give it back or scrap it."
        />
      )}
    </>
  );
}
