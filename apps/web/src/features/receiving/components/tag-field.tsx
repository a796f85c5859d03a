import { scannedTag } from '@hidewright/domain';
import { Camera } from 'lucide-react';
import { useState } from 'react';
import { useFormContext } from 'react-hook-form';
import { Button } from '../../../components/button.tsx';
import { CameraScanner } from '../../../components/camera-scanner.tsx';
import { describedBy, Field } from '../../../components/field.tsx';
import { InputFrame, inputLook } from '../../../components/input-frame.tsx';
import { noTagWords } from '../../../components/scan-field.tsx';
import { useField } from '../../../components/use-field.ts';

/** The tag of a lot: drawn by itself, typed, or read off one that hangs on it already. */
export function TagField({ name }: { name: string }) {
  const { setValue, setError } = useFormContext();
  const { id, register, error } = useField(name);
  const [camera, setCamera] = useState(false);

  function read(text: string) {
    const tag = scannedTag(text);
    if (tag === undefined) {
      setError(name, { message: noTagWords });
      return;
    }
    setValue(name, tag, { shouldDirty: true, shouldValidate: true });
    setCamera(false);
  }

  return (
    <div className="space-y-2">
      <Field
        id={id}
        label="Tag"
        optional
        help="Left empty, the next number is drawn."
        error={error}
      >
        <InputFrame id={id} invalid={error !== undefined}>
          <input
            {...register(name)}
            id={id}
            type="text"
            autoComplete="off"
            autoCapitalize="characters"
            spellCheck={false}
            aria-invalid={error !== undefined}
            aria-describedby={describedBy(id, { help: true, error })}
            // A hand scanner ends with Enter, which must not send the delivery.
            onKeyDown={(event) => {
              if (event.key === 'Enter') event.preventDefault();
            }}
            className={inputLook}
          />
        </InputFrame>
      </Field>
      <Button
        className="min-h-11"
        aria-expanded={camera}
        onClick={() => setCamera((open) => !open)}
      >
        <Camera size={18} aria-hidden="true" />
        {camera ? 'Close the camera' : 'Scan the tag'}
      </Button>
      {camera && <CameraScanner onRead={read} />}
    </div>
  );
}
