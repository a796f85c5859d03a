import type { Pattern } from '@hidewright/contract';
import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { countText, minutesText, percentText } from '../../../lib/formatting.ts';
import { hardwareWords, learningWords, optionWords, supplyWords } from '../pattern-words.ts';
import { hardwareNamesQuery } from '../patterns.queries.ts';
import { SettingRemarks } from './setting-remarks.tsx';
import { StepsTable } from './steps-table.tsx';

/** Leather, hardware, work and tooling of a pattern, in words. */
export function WhatItTakes({ pattern }: { pattern: Pattern }) {
  const { definition } = pattern;
  const { work, needsDie, needsPlate } = definition;
  const { data: names = new Map<number, string>() } = useQuery(hardwareNamesQuery());
  const known = new Map([
    ...names,
    ...pattern.hardware.map(({ hardwareId, name }) => [hardwareId, name] as const),
  ]);
  const tooling = [needsDie && 'cutting die', needsPlate && 'stamp plate'].filter(
    (each) => each !== false,
  );
  return (
    <div className="space-y-5">
      <SettingRemarks hardware={pattern.hardware} />
      <dl className="grid grid-cols-[auto_1fr] gap-x-6 gap-y-2">
        <Line word="leather">{pattern.leatherName}</Line>
        {Number(definition.leatherExtraPercent ?? '0') > 0 && (
          <Line word="on top of the layout">
            {percentText(definition.leatherExtraPercent ?? '0')}
          </Line>
        )}
        <List
          word="hardware"
          lines={definition.hardware.flatMap((line, at) => {
            const kind = pattern.hardware[at];
            return kind ? [hardwareWords(line, kind, work)] : [];
          })}
        />
        <List word="used up" lines={definition.supplies?.map(supplyWords)} />
        <List
          word="options"
          lines={definition.options?.map((option) => optionWords(option, known, work))}
        />
        <Line word="tooling">{tooling.length === 0 ? 'none' : tooling.join(', ')}</Line>
        <WorkLines definition={definition} />
      </dl>
      {work.kind === 'steps' && <StepsTable steps={work.steps} />}
    </div>
  );
}

function WorkLines({ definition }: Pick<Pattern, 'definition'>) {
  const { work, history } = definition;
  return (
    <>
      {work.kind === 'minutesPer100' && (
        <>
          <Line word="minutes per 100">{minutesText(work.minutes)}</Line>
          <Line word="rejects">{percentText(work.rejectPercent)}</Line>
        </>
      )}
      {history && (
        <Line word="own runs">
          {`${countText(history.good)} of ${countText(history.total)} came out good`}
        </Line>
      )}
      {work.secondsPercent !== undefined && (
        <Line word="seconds">{percentText(work.secondsPercent)}</Line>
      )}
      {work.learning && <Line word="practice">{learningWords(work.learning)}</Line>}
    </>
  );
}

/** Several of a kind, one below the other; where the pattern says nothing about them, no line at all. */
function List({ word, lines }: { word: string; lines: readonly string[] | undefined }) {
  if (lines === undefined) return null;
  if (lines.length === 0) return <Line word={word}>none</Line>;
  return (
    <Line word={word}>
      {lines.map((line) => (
        <span key={line} className="block">
          {line}
        </span>
      ))}
    </Line>
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
