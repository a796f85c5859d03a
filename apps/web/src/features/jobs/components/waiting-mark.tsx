/** What is logged here and has not arrived yet: nothing of it is lost. */
export function WaitingMark({ count }: { count: number }) {
  return (
    <p role="status" className="no-print sticky top-1 z-10 text-right">
      {count > 0 && (
        <span className="mb-2 inline-block rounded bg-brass-pale px-2.5 py-0.5 text-sm font-semibold text-brass">
          saved on this device, {count} waiting
        </span>
      )}
    </p>
  );
}
