import { LengthField } from '../../../components/length-field.tsx';
import { RadioCards } from '../../../components/radio-cards.tsx';
import { useDrawing } from '../use-drawing.ts';
import { useFreshErrors } from '../use-fresh-errors.ts';
import { DrawingFields } from './drawing-fields.tsx';
import { FieldRow } from './field-row.tsx';

const shapes = [
  { value: 'round', label: 'Round' },
  { value: 'rectangle', label: 'Rectangle', detail: 'with corner radius' },
  { value: 'oval', label: 'Oval' },
  { value: 'tag', label: 'Tag', detail: 'with a neck' },
  { value: 'polygon', label: 'From a drawing (SVG)', detail: 'any shape, with its holes' },
];

const cornerRadius = {
  name: 'cornerRadiusMm',
  label: 'Corner radius',
  help: '0 for sharp corners',
};
const measures: Record<string, readonly { name: string; label: string; help?: string }[]> = {
  round: [{ name: 'diameterMm', label: 'Diameter' }],
  rectangle: [
    { name: 'widthMm', label: 'Width' },
    { name: 'heightMm', label: 'Height' },
    cornerRadius,
  ],
  oval: [
    { name: 'widthMm', label: 'Width' },
    { name: 'heightMm', label: 'Height' },
  ],
  tag: [
    { name: 'lengthMm', label: 'Length', help: 'over all, neck included' },
    { name: 'widthMm', label: 'Width' },
    { name: 'neckLengthMm', label: 'Neck length' },
    { name: 'neckWidthMm', label: 'Neck width' },
    cornerRadius,
  ],
};

/** The closed curve that the cutting die cuts. */
export function OutlineFields() {
  const shape = useFreshErrors('definition.outline', 'shape');
  // Kept here, so that a look at another shape does not close the file.
  const drawing = useDrawing();
  return (
    <>
      <RadioCards name="definition.outline.shape" label="Outline" cards={shapes} across />
      {shape === 'polygon' ? (
        <DrawingFields {...drawing} />
      ) : (
        <FieldRow>
          {(measures[shape] ?? []).map(({ name, ...labels }) => (
            <LengthField
              key={`${shape} ${name}`}
              name={`definition.outline.${name}`}
              whenEmpty="text"
              {...labels}
            />
          ))}
        </FieldRow>
      )}
    </>
  );
}
