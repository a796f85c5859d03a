import type { Pattern } from '@hidewright/contract';
import { Notice } from '../../../components/notice.tsx';

/** What speaks against setting the hardware through this leather: said before a run is quoted. */
export function SettingRemarks({ hardware }: Pick<Pattern, 'hardware'>) {
  const remarked = hardware.filter(({ remarks }) => remarks.length > 0);
  return remarked.map(({ hardwareId, name, remarks }) => (
    <Notice key={hardwareId} tone="attention" title={`${name}:`}>
      {remarks.join(' ')}
    </Notice>
  ));
}
