import { usePathBox } from '../../../components/use-path-box.ts';

/** An outline the size of a word, beside its name, which says it all to the ear. */
export function OutlineMark({ path }: { path: string | null }) {
  const [measure, box] = usePathBox(path ?? '');
  if (path === null) return <span aria-hidden="true" className="h-8 w-10 shrink-0" />;
  return (
    <svg
      viewBox={[box.x, box.y, box.width, box.height].join(' ')}
      className="h-8 w-10 shrink-0"
      aria-hidden="true"
    >
      <path ref={measure} d={path} className="fill-russet" />
    </svg>
  );
}
