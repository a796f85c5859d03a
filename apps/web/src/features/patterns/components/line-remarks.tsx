import { useQuery } from '@tanstack/react-query';
import { useWatch } from 'react-hook-form';
import { Notice } from '../../../components/notice.tsx';
import { hardwareChoicesQuery, leatherChoicesQuery } from '../patterns.queries.ts';
import { remarksOn } from '../setting-remarks.ts';

/** Beside a line of hardware: what speaks against setting it through the chosen leather. */
export function LineRemarks({ at }: { at: number }) {
  const line = `definition.hardware.${at}`;
  const [leatherId, hardwareId, layers] = useWatch({
    name: ['definition.leatherId', `${line}.hardwareId`, `${line}.layers`],
  }) as unknown[];
  const { data: hardware = [] } = useQuery(hardwareChoicesQuery());
  const { data: leathers = [] } = useQuery(leatherChoicesQuery());
  const remarks = remarksOn(
    hardware.find(({ id }) => id === Number(hardwareId)),
    hardware,
    leathers.find(({ id }) => id === Number(leatherId)),
    layers,
  );
  if (remarks.length === 0) return null;
  return (
    <Notice tone="attention" live className="mt-2">
      {remarks.join(' ')}
    </Notice>
  );
}
