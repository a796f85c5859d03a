import { TextField, type TextFieldProps } from './text-field.tsx';

/** A figure that may have decimals: minutes, per cent, ounces, seconds. It travels as text, exactly as typed. */
export function DecimalField(props: Omit<TextFieldProps, 'type' | 'inputMode'>) {
  const whenEmpty = props.whenEmpty ?? (props.optional ? 'absent' : 'text');
  return <TextField short {...props} whenEmpty={whenEmpty} inputMode="decimal" />;
}
