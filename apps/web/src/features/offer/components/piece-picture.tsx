import type { Offer } from '@hidewright/contract';
import { useId } from 'react';
import { usePathBox } from '../../../components/use-path-box.ts';

/** The piece itself, lying on the bench a little askew, as things do. */
export function PiecePicture({ outline }: { outline: NonNullable<Offer['outline']> }) {
  const id = useId();
  const [measure, box] = usePathBox(outline.path);
  const reach = Math.max(box.width, box.height * 2, 1) * 0.62;
  const [middleX, middleY] = [box.x + box.width / 2, box.y + box.height / 2];
  return (
    <svg
      role="img"
      aria-labelledby={id}
      viewBox={`${middleX - reach} ${middleY - reach / 2} ${2 * reach} ${reach}`}
      className="block w-full rounded bg-panel/40"
    >
      <title id={id}>{`The piece: ${outline.words}`}</title>
      <g
        transform={`rotate(-8 ${middleX} ${middleY}) translate(${middleX} ${middleY}) scale(0.86) translate(${-middleX} ${-middleY})`}
      >
        <path ref={measure} d={outline.path} fillRule="evenodd" className="fill-russet" />
      </g>
    </svg>
  );
}
