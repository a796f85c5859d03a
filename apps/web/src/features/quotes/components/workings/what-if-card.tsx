import {
  DomainError,
  rejectShare,
  priceRun,
  withMinutes,
  withRejects,
  type BreakNumbers,
  type RunInput,
} from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { useId, useState, type ReactNode } from 'react';
import { Button } from '../../../../components/button.tsx';
import { Card } from '../../../../components/card.tsx';
import { KeyFigures } from '../../../../components/key-figures.tsx';
import { Notice } from '../../../../components/notice.tsx';
import { moneyText } from '../../../../lib/formatting.ts';

interface WhatIfCardProps {
  input: RunInput;
  rung: BreakNumbers;
}

interface Supposed {
  price: string;
  rejects: string;
  minutes: string;
  leather: string;
}

/** Tries other figures without saving any: what an hour would earn then. */
export function WhatIfCard({ input, rung }: WhatIfCardProps) {
  const asItIs = startingFrom(input, rung);
  const [supposed, setSupposed] = useState<Partial<Supposed>>({});
  const now = { ...asItIs, ...supposed };
  const outcome = suppose(input, rung, now, supposed);
  const set = (name: keyof Supposed) => (value: string) =>
    setSupposed((before) => ({ ...before, [name]: value }));
  return (
    <Card
      title="What if"
      subtitle="tried out here, saved nowhere"
      aside={
        <Button tone="quiet" onClick={() => setSupposed({})}>
          As it stands
        </Button>
      }
    >
      <div className="flex flex-wrap gap-x-4 gap-y-3">
        <Figure label="Price each" value={now.price} onChange={set('price')} />
        <Figure label="Rejects" unit="%" value={now.rejects} onChange={set('rejects')} />
        <Figure label="Minutes" unit="% of now" value={now.minutes} onChange={set('minutes')} />
        <Figure label="Leather" unit="/ ft²" value={now.leather} onChange={set('leather')} />
      </div>
      <div className="mt-4" role="status">
        {'why' in outcome ? (
          <Notice tone="info">{outcome.why}</Notice>
        ) : (
          <Outcome {...outcome} was={rung} />
        )}
      </div>
    </Card>
  );
}

function Outcome({ then, was }: { then: BreakNumbers; was: BreakNumbers }) {
  const compared = (word: string, after: string, before: string) => ({
    word,
    figure: moneyText(after),
    note: `${moneyText(before)} as it stands`,
  });
  return (
    <KeyFigures
      figures={[
        compared('per bench hour', then.perBenchHour, was.perBenchHour),
        compared('per hour all in', then.perHourAllIn, was.perHourAllIn),
        compared('left', then.left, was.left),
      ]}
    />
  );
}

interface FigureProps {
  label: string;
  unit?: ReactNode;
  value: string;
  onChange: (value: string) => void;
}

function Figure({ label, unit, value, onChange }: FigureProps) {
  const id = useId();
  return (
    <div>
      <label htmlFor={id} className="mb-1 block font-semibold">
        {label}
      </label>
      <span className="flex items-center gap-1.5">
        <input
          id={id}
          inputMode="decimal"
          value={value}
          onChange={(event) => onChange(event.target.value)}
          className="min-h-10 w-24 rounded border border-edge bg-card px-3 py-1.5 text-right"
        />
        {unit && <span className="text-sm text-ink-soft">{unit}</span>}
      </span>
    </div>
  );
}

function startingFrom(input: RunInput, rung: BreakNumbers): Supposed {
  return {
    price: rung.priceEach,
    rejects: new Decimal(rejectShare(input.work)).times(100).toDecimalPlaces(2).toFixed(),
    minutes: '100',
    leather: input.leather.pricePerFt2,
  };
}

function suppose(
  input: RunInput,
  { quantity }: BreakNumbers,
  now: Supposed,
  changed: Partial<Supposed>,
): { then: BreakNumbers } | { why: string } {
  const plain = /^\d{1,9}(\.\d{1,4})?$/;
  if (Object.values(now).some((value) => !plain.test(value))) {
    return { why: 'Write each as a plain number, such as 4.20.' };
  }
  try {
    const work = changed.rejects === undefined ? input.work : withRejects(input.work, now.rejects);
    const { breaks } = priceRun({
      ...input,
      options: [],
      breaks: [{ quantity, typedPrice: now.price }],
      leather: { ...input.leather, pricePerFt2: now.leather },
      history: changed.rejects === undefined ? (input.history ?? null) : null,
      work: withMinutes(work, now.minutes),
    });
    return { then: breaks[0] as BreakNumbers };
  } catch (error) {
    if (error instanceof DomainError) return { why: error.message };
    throw error;
  }
}
