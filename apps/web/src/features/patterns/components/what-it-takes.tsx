import type { Pattern } from '@hidewright/contract';
import type { ReactNode } from 'react';
import { countText, minutesText, percentText } from '../../../lib/formatting.ts';
import { StepsTable } from './steps-table.tsx';

/** Leather, hardware, work and tooling of a pattern, in words. */
export function WhatItTakes({ pattern }: { pattern: Pattern }) {
  const { work, needsDie, needsPlate } = pattern.definition;
  const tooling = [needsDie && 'cutting die', needsPlate && 'stamp plate'].filter(
    (each) => each !== false,
  );
  return (
    <div className="space-y-5">
      <dl className="grid grid-cols-[auto_1fr] gap-x-6 gap-y-2">
        <Line word="leather">{pattern.leatherName}</Line>
        <Line word="hardware">
          {pattern.hardware.length === 0
            ? 'none'
            : pattern.hardware.map(({ hardwareId, name, perPiece }) => (
                <span key={hardwareId} className="block">{`${countText(perPiece)} × ${name}`}</span>
              ))}
        </Line>
        <Line word="tooling">{tooling.length === 0 ? 'none' : tooling.join(', ')}</Line>
        {work.kind === 'minutesPer100' && (
          <>
            <Line word="minutes per 100">{minutesText(work.minutes)}</Line>
            <Line word="rejects">{percentText(work.rejectPercent)}</Line>
          </>
        )}
      </dl>
      {work.kind === 'steps' && <StepsTable steps={work.steps} />}
    </div>
  );
}

function Line({ word, children }: { word: string; children: ReactNode }) {
  return (
    <>
      <dt className="text-ink-soft">{word}</dt>
      <dd className="font-semibold">{children}</dd>
    </>
  );
}
