import { useId } from 'react';
import { InputFrame, inputLook } from '../../../components/input-frame.tsx';
import { SelectInput } from '../../../components/select-input.tsx';
import { plainGrids, type SheetMeasures } from '../label-choice.ts';

const fields: readonly { name: keyof SheetMeasures; label: string; unit: string }[] = [
  { name: 'columns', label: 'Side by side', unit: 'labels' },
  { name: 'rows', label: 'One below the other', unit: 'labels' },
  { name: 'widthMm', label: 'Width of a label', unit: 'mm' },
  { name: 'heightMm', label: 'Height of a label', unit: 'mm' },
  { name: 'leftMm', label: 'Margin at the left', unit: 'mm' },
  { name: 'topMm', label: 'Margin above', unit: 'mm' },
  { name: 'gapAcrossMm', label: 'Gap between columns', unit: 'mm' },
  { name: 'gapDownMm', label: 'Gap between rows', unit: 'mm' },
];

interface SheetMeasuresProps {
  measures: SheetMeasures;
  onChange: (measures: SheetMeasures) => void;
}

/** How the sheet of labels is measured: a plain grid, or the owner's own figures. */
export function SheetMeasuresFields({ measures, onChange }: SheetMeasuresProps) {
  const id = useId();
  const set = (name: keyof SheetMeasures, value: string) =>
    onChange({ ...measures, [name]: value });
  return (
    <div className="space-y-4">
      <div>
        <label htmlFor={`${id}-grid`} className="mb-1 block font-semibold">
          Begin with
        </label>
        <SelectInput
          id={`${id}-grid`}
          value={plainGrids.find((grid) => sameGrid(grid.measures, measures))?.label ?? ''}
          onChange={(event) => {
            const grid = plainGrids.find(({ label }) => label === event.target.value);
            if (grid) onChange({ ...grid.measures, start: measures.start });
          }}
        >
          <option value="">your own measures</option>
          {plainGrids.map(({ label }) => (
            <option key={label} value={label} className="bg-card text-ink">
              {label}
            </option>
          ))}
        </SelectInput>
      </div>
      <Measure
        id={`${id}-start`}
        label="Begin at label"
        unit="of the sheet"
        value={measures.start}
        onType={(value) => set('start', value)}
      />
      <details>
        <summary className="rounded py-1 font-semibold">Measures of the sheet</summary>
        <div className="mt-3 grid gap-4 sm:grid-cols-2">
          <div>
            <label htmlFor={`${id}-page`} className="mb-1 block font-semibold">
              Sheet
            </label>
            <SelectInput
              id={`${id}-page`}
              short
              value={measures.page}
              onChange={(event) => set('page', event.target.value)}
            >
              <option value="a4">A4</option>
              <option value="letter">Letter</option>
            </SelectInput>
          </div>
          {fields.map(({ name, label, unit }) => (
            <Measure
              key={name}
              id={`${id}-${name}`}
              label={label}
              unit={unit}
              value={measures[name]}
              onType={(value) => set(name, value)}
            />
          ))}
        </div>
      </details>
    </div>
  );
}

const sameGrid = (one: SheetMeasures, other: SheetMeasures): boolean =>
  one.page === other.page && fields.every(({ name }) => one[name] === other[name]);

interface MeasureProps {
  id: string;
  label: string;
  unit: string;
  value: string;
  onType: (value: string) => void;
}

function Measure({ id, label, unit, value, onType }: MeasureProps) {
  return (
    <div>
      <label htmlFor={id} className="mb-1 block font-semibold">
        {label}
      </label>
      <InputFrame id={id} unit={unit} short invalid={false}>
        <input
          id={id}
          type="text"
          inputMode="decimal"
          autoComplete="off"
          value={value}
          aria-describedby={`${id}-unit`}
          onChange={(event) => onType(event.target.value)}
          className={inputLook}
        />
      </InputFrame>
    </div>
  );
}
