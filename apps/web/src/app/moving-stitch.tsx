import { useNavigation } from 'react-router-dom';

/** While the next place is being fetched, a seam runs along the top. */
export function MovingStitch() {
  const { state } = useNavigation();
  if (state === 'idle') return null;
  return (
    <div role="status" className="no-print fixed inset-x-0 top-0 z-60">
      <span className="sr-only">Loading</span>
      <div aria-hidden="true" className="stitched-act h-1 motion-safe:animate-pulse" />
    </div>
  );
}
