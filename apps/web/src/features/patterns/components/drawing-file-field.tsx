import { useState } from 'react';
import { describedBy, Field } from '../../../components/field.tsx';
import { useField } from '../../../components/use-field.ts';
import { classNames } from '../../../lib/class-names.ts';

interface DrawingFileFieldProps {
  /** The file that is open. */
  fileName: string | undefined;
  /** Why the last one could not be read. */
  refusal: string | undefined;
  onOpen: (file: File) => Promise<void>;
}

const help =
  'An SVG file, also dropped here. It is read on this computer; only the outline is kept.';

/** Where the drawing comes from: chosen, or dropped on it. */
export function DrawingFileField({ fileName, refusal, onOpen }: DrawingFileFieldProps) {
  const { id, error: missing } = useField('definition.outline.points');
  const { error: wrongHoles } = useField('definition.outline.punched');
  const [over, setOver] = useState(false);
  // What the browser itself says beside the button.
  const [named, setNamed] = useState<string>();
  const error = refusal ?? missing ?? wrongHoles;

  function take(files: FileList | null) {
    const [file] = files ?? [];
    if (file) void onOpen(file);
  }

  return (
    <Field id={id} label="Drawing" help={help} error={error}>
      <div
        className={classNames(
          'rounded border border-dashed p-3',
          error ? 'border-2 border-oxblood' : 'border-edge',
          over ? 'bg-verdigris-pale' : 'bg-card',
        )}
        onDragOver={(event) => {
          event.preventDefault();
          setOver(true);
        }}
        onDragLeave={() => setOver(false)}
        onDrop={(event) => {
          event.preventDefault();
          setOver(false);
          take(event.dataTransfer.files);
        }}
      >
        <input
          id={id}
          type="file"
          accept=".svg,image/svg+xml"
          aria-invalid={error !== undefined}
          aria-describedby={describedBy(id, { help, error })}
          className="block w-full file:mr-3 file:rounded file:border file:border-edge file:bg-card file:px-3.5 file:py-1.5 file:font-semibold hover:file:bg-manila"
          onClick={(event) => {
            // The same file, mended, can be chosen again.
            event.currentTarget.value = '';
            setNamed(undefined);
          }}
          onChange={(event) => {
            setNamed(event.target.files?.[0]?.name);
            take(event.target.files);
          }}
        />
        {fileName !== undefined && fileName !== named && (
          <p role="status" className="mt-2 text-sm">
            Open: <strong className="font-semibold break-all">{fileName}</strong>
          </p>
        )}
      </div>
    </Field>
  );
}
