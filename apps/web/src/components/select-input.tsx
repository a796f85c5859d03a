import { ChevronDown } from 'lucide-react';
import type { ComponentProps } from 'react';
import { InputFrame, inputLook } from './input-frame.tsx';

interface SelectInputProps extends ComponentProps<'select'> {
  id: string;
  invalid?: boolean | undefined;
  /** As wide as a figure needs, or as the column. */
  short?: boolean | undefined;
}

/** The device's own list in the frame that every field has. */
export function SelectInput({ id, invalid = false, short, children, ...select }: SelectInputProps) {
  return (
    <InputFrame id={id} short={short} invalid={invalid}>
      <select
        {...select}
        id={id}
        aria-invalid={invalid}
        className={`${inputLook} -mr-8 appearance-none pr-9`}
      >
        {children}
      </select>
      <ChevronDown size={18} aria-hidden="true" className="pointer-events-none mr-2.5 shrink-0" />
    </InputFrame>
  );
}
