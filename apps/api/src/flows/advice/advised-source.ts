import type { CutSource } from '@hidewright/domain';
import type { CutAdviceReply } from '@hidewright/contract';
import type { LayoutToKeep } from '../../modules/layouts/stored-layouts.ts';

type Row = CutAdviceReply['rows'][number];

/** Something that a run can be cut from, as the domain compares it and as the reply shows it. */
export interface AdvisedSource {
  source: CutSource;
  shown: Pick<Row, 'kind' | 'widthMm' | 'heightMm' | 'lotId' | 'tag' | 'stripsMm' | 'estimated'>;
  /** Strips: length of one repeat. */
  periodMm: number | null;
  /** Panels: what is left when only so many pieces of one are cut. */
  offcutAfter: ((pieces: number) => Row['offcut']) | null;
}

/** Notes a layout that is compared, shown or not, so that it is kept. */
export type Note = <Laid extends LayoutToKeep>(worked: Laid) => Laid;
