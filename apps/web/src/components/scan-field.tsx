import { scannedTag } from '@hidewright/domain';
import { Camera } from 'lucide-react';
import { useId, useState, type KeyboardEvent, type ReactNode } from 'react';
import { Button } from './button.tsx';
import { CameraScanner } from './camera-scanner.tsx';
import { Field } from './field.tsx';
import { InputFrame, inputLook } from './input-frame.tsx';

interface ScanFieldProps {
  label: string;
  /** The tag that was read: bare, whatever address it stood in. */
  onScan: (tag: string) => void;
  help?: ReactNode | undefined;
  /** What is wrong with the last tag: beside the field, and read out. */
  error?: string | undefined;
}

/** What was read is longer than any tag, such as the code of a web page. */
export const noTagWords =
  'That is no tag of this workshop. Scan the one on the lot, bin, order or ticket, or type it, such as T-0012.';

/**
 * Where a tag is read: a hand scanner types into it and ends with Enter, as a person may, and a button opens the
 * camera. It stands outside or inside a form without sending it.
 */
export function ScanField({ label, onScan, help, error }: ScanFieldProps) {
  const id = useId();
  const [typed, setTyped] = useState('');
  const [camera, setCamera] = useState(false);
  const [isNoTag, setIsNoTag] = useState(false);
  const wrong = isNoTag ? noTagWords : error;

  function read(text: string) {
    const tag = scannedTag(text);
    setTyped('');
    setIsNoTag(tag === undefined && text.trim() !== '');
    if (tag !== undefined) onScan(tag);
  }

  function onKeyDown(event: KeyboardEvent) {
    if (event.key !== 'Enter') return;
    event.preventDefault();
    read(typed);
  }

  return (
    <div className="space-y-3">
      <Field id={id} label={label} help={help}>
        <div className="flex flex-wrap gap-2">
          <div className="min-w-0 grow basis-44">
            <InputFrame id={id} invalid={wrong !== undefined}>
              <input
                id={id}
                type="text"
                value={typed}
                autoComplete="off"
                autoCapitalize="characters"
                spellCheck={false}
                enterKeyHint="go"
                aria-invalid={wrong !== undefined}
                aria-describedby={wrong === undefined ? undefined : `${id}-read`}
                onChange={(event) => setTyped(event.target.value)}
                onKeyDown={onKeyDown}
                className={`${inputLook} min-h-11`}
              />
            </InputFrame>
          </div>
          <Button className="min-h-11" onClick={() => read(typed)}>
            Go
          </Button>
          <Button
            className="min-h-11"
            aria-expanded={camera}
            onClick={() => setCamera((open) => !open)}
          >
            <Camera size={18} aria-hidden="true" />
            {camera ? 'Close the camera' : 'Use the camera'}
          </Button>
        </div>
      </Field>
      <p id={`${id}-read`} role="alert" className="font-semibold text-oxblood empty:hidden">
        {wrong}
      </p>
      {camera && <CameraScanner onRead={read} />}
    </div>
  );
}
