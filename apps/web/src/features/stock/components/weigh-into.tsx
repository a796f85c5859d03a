import { useFormContext } from 'react-hook-form';
import { WeighCount } from '../../../components/weigh-count.tsx';

/** Counts by weight into a field of the form. */
export function WeighInto({ name }: { name: string }) {
  const { setValue } = useFormContext();
  return (
    <WeighCount
      onCount={(count) => setValue(name, count, { shouldDirty: true, shouldValidate: true })}
    />
  );
}
