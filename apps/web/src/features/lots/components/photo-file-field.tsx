import { photoLimits } from '@hidewright/contract';
import { useId } from 'react';
import { describedBy, Field } from '../../../components/field.tsx';

interface PhotoFileFieldProps {
  /** Why the last one cannot be used. */
  refusal: string | undefined;
  onChoose: (file: File) => void;
}

const help = 'PNG, JPEG or WebP, at most 15 MB. It is kept with the drawing when you save it.';

/** Where the photo comes from; on a phone that may be its camera. */
export function PhotoFileField({ refusal, onChoose }: PhotoFileFieldProps) {
  const id = useId();
  return (
    <Field id={id} label="Photo of the side" help={help} error={refusal}>
      <input
        id={id}
        type="file"
        accept={photoLimits.types.join(',')}
        aria-invalid={refusal !== undefined}
        aria-describedby={describedBy(id, { help, error: refusal })}
        className="block w-full file:mr-3 file:rounded file:border file:border-edge file:bg-card file:px-3.5 file:py-1.5 file:font-semibold hover:file:bg-manila"
        onClick={(event) => {
          // The same file, mended, can be chosen again.
          event.currentTarget.value = '';
        }}
        onChange={({ target }) => {
          const [file] = target.files ?? [];
          if (file) onChoose(file);
        }}
      />
    </Field>
  );
}
