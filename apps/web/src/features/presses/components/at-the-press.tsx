import type { PressReply } from '@hidewright/contract';
import { pressLoad, takesPanel, widestStripMm, type Load } from '@hidewright/domain';
import { lengthText, numberText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { limitsOf } from '../press-limits.ts';

interface AtThePressProps {
  presses: readonly PressReply[];
  /** Of one strike, all its pieces together. */
  cuttingEdgeMm: number;
  reliefAreaMm2: number | null;
  /** What is laid on the bed; a strip is fed along it. */
  laid: { form: 'panel'; widthMm: number; heightMm: number } | { form: 'strip'; widthMm: number };
}

/** How one strike of a pattern stands against what each press manages, and whether its leather goes in. */
export function AtThePress({ presses, cuttingEdgeMm, reliefAreaMm2, laid }: AtThePressProps) {
  return (
    <ul className="space-y-4">
      {presses.map((press) => {
        const limits = limitsOf(press);
        const load = pressLoad(limits, { cuttingEdgeMm, reliefAreaMm2 });
        return (
          <li key={press.id}>
            <h3 className="font-semibold">{press.name}</h3>
            <LoadBar what="Cutting edge" load={load.rule} unit="mm" />
            <LoadBar what="Relief" load={load.relief} unit="mm²" />
            {load.rule === null && load.relief === null && (
              <p className="text-ink-soft">No figure says what it manages.</p>
            )}
            <Bed press={press} laid={laid} />
          </li>
        );
      })}
    </ul>
  );
}

function LoadBar({ what, load, unit }: { what: string; load: Load | null; unit: string }) {
  if (load === null) return null;
  const tooMuch = load.word === 'too much';
  return (
    <div className="mt-1.5">
      <div className="flex flex-wrap justify-between gap-x-4">
        <span>{`${what}: ${numberText(String(Math.round(load.asked)), 0)} of ${numberText(String(Math.round(load.manages)), 0)} ${unit}`}</span>
        <span className={tooMuch ? 'font-semibold text-oxblood' : 'text-ink-soft'}>
          {load.word}
        </span>
      </div>
      <div className="mt-1 h-2 rounded-full bg-stitch/60" aria-hidden="true">
        <div
          className={`h-2 rounded-full ${tooMuch ? 'bg-oxblood' : load.share > 0.85 ? 'bg-brass' : 'bg-verdigris'}`}
          style={{ width: `${Math.min(100, load.share * 100)}%` }}
        />
      </div>
    </div>
  );
}

function Bed({ press, laid }: { press: PressReply; laid: AtThePressProps['laid'] }) {
  const { lengthUnit } = useWorkshop();
  const limits = limitsOf(press);
  const widest = lengthText(String(widestStripMm(limits)), lengthUnit);
  if (laid.form === 'strip') {
    const fits = laid.widthMm <= widestStripMm(limits);
    return (
      <p className={fits ? 'mt-1.5 text-ink-soft' : 'mt-1.5 font-semibold text-oxblood'}>
        {fits
          ? `The strip goes in: up to ${widest} wide.`
          : `The strip is wider than the ${widest} that go in. Cut it narrower.`}
      </p>
    );
  }
  return (
    <p className="mt-1.5 text-ink-soft">
      {takesPanel(limits, laid.widthMm, laid.heightMm)
        ? 'The panel lies whole on the bed.'
        : `The panel does not lie whole on the bed: cut it into strips of up to ${widest}.`}
    </p>
  );
}
