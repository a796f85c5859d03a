import { TextArea } from '../../../components/text-area.tsx';
import { TextField } from '../../../components/text-field.tsx';

/** Who they are and how to reach them. */
export function CustomerFields() {
  return (
    <>
      <TextField name="name" label="Name" autoComplete="off" />
      <TextField name="contactName" label="Who we talk to" optional />
      <TextField
        name="email"
        type="email"
        label="E-mail address"
        optional
        help="Quotes and invoices go there; without one they go by hand."
      />
      <TextField name="phone" type="tel" label="Phone" optional />
      <TextArea name="address" label="Address" rows={3} optional />
      <TextArea name="note" label="Note" rows={3} optional help="For the shop alone." />
    </>
  );
}
