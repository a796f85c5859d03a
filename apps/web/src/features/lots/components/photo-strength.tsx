import { useId } from 'react';

interface PhotoStrengthProps {
  strength: number;
  onChange: (strength: number) => void;
}

/** How strong the photo shows under the drawing; at the left end it is hidden. */
export function PhotoStrength({ strength, onChange }: PhotoStrengthProps) {
  const id = useId();
  return (
    <div className="flex max-w-xl flex-wrap items-center gap-x-3 gap-y-1">
      <label htmlFor={id} className="font-semibold">
        Photo
      </label>
      <span className="text-sm text-ink-soft">hidden</span>
      <input
        id={id}
        type="range"
        min={0}
        max={100}
        step={10}
        value={strength}
        aria-valuetext={strength === 0 ? 'hidden' : `${strength} %`}
        onChange={(event) => onChange(Number(event.target.value))}
        className="h-8 grow accent-verdigris"
      />
      <span className="text-sm text-ink-soft">strong</span>
    </div>
  );
}
