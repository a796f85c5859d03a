import { useId } from 'react';
import { sizeText } from '../lib/formatting.ts';
import { useWorkshop } from '../lib/workshop.tsx';
import { usePathBox } from './use-path-box.ts';

interface OutlinePictureProps {
  /** SVG path data in mm; holes as further subpaths. */
  outlinePath: string;
  title: string;
  /** With its width and height below it. */
  dimensions?: boolean | undefined;
  className?: string | undefined;
}

/** One piece as the cutting die leaves it, to scale within its frame. */
export function OutlinePicture({
  outlinePath,
  title,
  dimensions = true,
  className,
}: OutlinePictureProps) {
  const { lengthUnit } = useWorkshop();
  const id = useId();
  const [measure, box] = usePathBox(outlinePath);
  const margin = Math.max(box.width, box.height) * 0.08 || 1;
  const view = [box.x - margin, box.y - margin, box.width + 2 * margin, box.height + 2 * margin];
  const size = sizeText(box.width.toFixed(3), box.height.toFixed(3), lengthUnit);
  return (
    <figure className={className}>
      <svg
        role="img"
        aria-labelledby={`${id}-title ${id}-desc`}
        viewBox={view.join(' ')}
        className="block h-auto max-h-64 w-full rounded bg-panel/40"
      >
        <title id={`${id}-title`}>{title}</title>
        <desc id={`${id}-desc`}>{`The outline measures ${size}.`}</desc>
        <path ref={measure} d={outlinePath} fillRule="evenodd" className="fill-russet" />
      </svg>
      {dimensions && <figcaption className="mt-1.5 text-sm text-ink-soft">{size}</figcaption>}
    </figure>
  );
}
