import type { Hardware } from '@hidewright/contract';
import type { ReactNode } from 'react';
import { TextLink } from '../../../components/text-link.tsx';
import { countText } from '../../../lib/formatting.ts';

/** What it is made up of, what it is a part of, and what may stand in for it. */
export function RelatedHardware({ hardware }: { hardware: Hardware }) {
  const { parts, partOf, standIns } = hardware;
  return (
    <dl className="space-y-4">
      {parts.length > 0 && (
        <Group word="One of it is">
          {parts.map(({ hardwareId, name, quantity, free }) => (
            <li key={hardwareId}>
              {`${countText(quantity)} × `}
              <ItemLink id={hardwareId} name={name} />
              <span className="text-ink-soft">{`, ${countText(free)} free`}</span>
            </li>
          ))}
        </Group>
      )}
      {partOf.length > 0 && (
        <Group word="It is a part of">
          {partOf.map(({ hardwareId, name }) => (
            <li key={hardwareId}>
              <ItemLink id={hardwareId} name={name} />
            </li>
          ))}
        </Group>
      )}
      {standIns.length > 0 && (
        <Group word="In its place may be taken">
          {standIns.map(({ hardwareId, name, bothWays, free }) => (
            <li key={hardwareId}>
              <ItemLink id={hardwareId} name={name} />
              <span className="text-ink-soft">
                {`, ${countText(free)} free${bothWays ? '; the other way round as well' : ''}`}
              </span>
            </li>
          ))}
        </Group>
      )}
    </dl>
  );
}

export const hasRelated = ({ parts, partOf, standIns }: Hardware): boolean =>
  parts.length + partOf.length + standIns.length > 0;

function Group({ word, children }: { word: string; children: ReactNode }) {
  return (
    <div>
      <dt className="text-sm text-ink-soft">{word}</dt>
      <dd>
        <ul className="space-y-1">{children}</ul>
      </dd>
    </div>
  );
}

function ItemLink({ id, name }: { id: number; name: string }) {
  return <TextLink to={`/stockroom/hardware/${id}`}>{name}</TextLink>;
}
