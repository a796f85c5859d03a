import { useWatch } from 'react-hook-form';
import { Checkbox } from '../../../components/checkbox.tsx';
import { TextArea } from '../../../components/text-area.tsx';

interface TellCustomerFieldsProps {
  customerName: string;
  /** Why it cannot be done; null where it can. */
  cannotMail: string | null;
}

/** Whether the customer is told by mail, with a few words of the owner's own. */
export function TellCustomerFields({ customerName, cannotMail }: TellCustomerFieldsProps) {
  const telling: unknown = useWatch({ name: 'tellCustomer' });
  if (cannotMail !== null) return <p className="text-ink-soft">{cannotMail}</p>;
  return (
    <>
      <Checkbox name="tellCustomer" label={`Tell ${customerName} by mail`} />
      {telling === true && (
        <TextArea
          name="word"
          label="A word with it"
          rows={3}
          optional
          help="The mail says what changes; this stands below it."
        />
      )}
    </>
  );
}
