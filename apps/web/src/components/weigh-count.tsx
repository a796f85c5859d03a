import { countByWeight, InvalidInput, type WeighedCount } from '@hidewright/domain';
import { useState } from 'react';
import { unclearComma, withPoint } from '../lib/comma.ts';
import { countText } from '../lib/formatting.ts';
import { Button } from './button.tsx';
import { PlainField } from './plain-field.tsx';

interface WeighCountProps {
  /** Takes the count over into whatever is being counted. */
  onCount: (count: number) => void;
  /** Whose count it is, where several stand below each other. */
  of?: string | undefined;
}

const blank = { sampleCount: '10', sampleGrams: '', allGrams: '', tareGrams: '0', step: '0.1' };
type Typed = typeof blank;

const fields: { name: keyof Typed; label: string; unit: string }[] = [
  { name: 'sampleCount', label: 'Counted out', unit: 'pieces' },
  { name: 'sampleGrams', label: 'They weigh', unit: 'g' },
  { name: 'allGrams', label: 'All weigh, with the tub', unit: 'g' },
  { name: 'tareGrams', label: 'Empty tub', unit: 'g' },
  { name: 'step', label: 'Scale shows steps of', unit: 'g' },
];

/** Counting by weight: weigh ten, weigh all. It stands in a form and is none itself. */
export function WeighCount({ onCount, of }: WeighCountProps) {
  const [typed, setTyped] = useState<Typed>(blank);
  const found = read(typed);
  return (
    <details>
      <summary className="min-h-11 rounded py-2.5 font-semibold">
        Count by weight
        {of !== undefined && <span className="sr-only">{`: ${of}`}</span>}
      </summary>
      <div className="mt-2 grid grid-cols-2 gap-x-4 gap-y-3">
        {fields.map(({ name, ...labels }) => (
          <PlainField
            key={name}
            {...labels}
            value={typed[name]}
            error={'field' in found && found.field === name ? found.sentence : undefined}
            onChange={(text) => setTyped({ ...typed, [name]: text })}
          />
        ))}
      </div>
      <div role="status" className="mt-3 space-y-3">
        {'count' in found && (
          <>
            <p>{found.sentence}</p>
            <Button
              className="min-h-11"
              onClick={() => onCount(found.count)}
            >{`Take ${countText(found.count)}`}</Button>
          </>
        )}
      </div>
    </details>
  );
}

type Found = WeighedCount | { field: string; sentence: string } | Record<string, never>;

/** Nothing is said while something is still to be typed. */
function read(typed: Typed): Found {
  const unclear = fields.find(({ name }) => unclearComma(typed[name]) !== undefined);
  if (unclear) return { field: unclear.name, sentence: unclearComma(typed[unclear.name]) ?? '' };
  const text = (name: keyof Typed) => withPoint(typed[name]);
  if (fields.some(({ name }) => text(name) === '')) return {};
  try {
    return countByWeight({
      sampleCount: Number(text('sampleCount')),
      sampleGrams: text('sampleGrams'),
      allGrams: text('allGrams'),
      tareGrams: text('tareGrams'),
      scaleStepGrams: text('step'),
    });
  } catch (error) {
    if (!(error instanceof InvalidInput)) throw error;
    const field = error.field === 'scaleStepGrams' ? 'step' : error.field;
    return { field, sentence: sentenceFor(error.message) };
  }
}

/** The domain names its own fields; a person is told what to do beside the right one. */
const sentenceFor = (message: string): string =>
  message.startsWith('Write') ? 'Enter a plain number, such as 12.5.' : message;
