/** What is logged here and has not arrived yet: nothing of it is lost. */
export function WaitingMark({ count }: { count: number }) {
  return (
    <p role="status" className="no-print mb-2 text-right">
      {count > 0 && (
        <span className="inline-block rounded bg-brass-pale px-2.5 py-0.5 text-sm font-semibold text-brass">
          saved on this device, {count} waiting
        </span>
      )}
    </p>
  );
}
