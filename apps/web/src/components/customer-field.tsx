import { useEffect, useState, type ReactNode } from 'react';
import { useFormContext } from 'react-hook-form';
import { Button } from './button.tsx';
import { Dialog } from './dialog.tsx';
import { SelectField, type Choice } from './select-field.tsx';

interface CustomerFieldProps {
  choices: readonly Choice[];
  newCustomer: (onAdded: (id: number) => void) => ReactNode;
}

/** Who asks or buys; somebody new is added on the spot. */
export function CustomerField({ choices, newCustomer }: CustomerFieldProps) {
  const { setValue } = useFormContext();
  const [open, setOpen] = useState(false);
  const [added, setAdded] = useState<number>();

  // The new customer can only be chosen once the list has them.
  useEffect(() => {
    if (added === undefined || !choices.some((choice) => choice.value === added)) return;
    setValue('customerId', added, { shouldDirty: true, shouldValidate: true });
    setAdded(undefined);
  }, [added, choices, setValue]);

  return (
    <div className="flex flex-wrap items-start gap-3">
      <div className="min-w-56 grow">
        <SelectField
          name="customerId"
          label="Customer"
          choices={choices}
          placeholder={choices.length === 0 ? 'Nobody yet: add the first' : 'Choose a customer'}
        />
      </div>
      <Button className="min-h-10 sm:mt-7" onClick={() => setOpen(true)}>
        New customer
      </Button>
      <Dialog open={open} onOpenChange={setOpen} title="New customer">
        {newCustomer((id) => {
          setAdded(id);
          setOpen(false);
        })}
      </Dialog>
    </div>
  );
}
