import { Mail } from 'lucide-react';

/** In the demo nothing leaves this machine, and every page says so. */
export function DemoBanner({ mailboxUrl }: { mailboxUrl: string | null }) {
  return (
    <aside
      aria-label="Demo workshop"
      className="no-print flex flex-wrap items-center justify-center gap-x-2 bg-slate-pale px-4 py-1 text-center text-sm"
    >
      <Mail size={15} aria-hidden="true" className="text-slate" />
      <span>Demo workshop: mail stays on this machine.</span>
      {mailboxUrl && (
        <a href={mailboxUrl} className="font-semibold text-slate underline underline-offset-3">
          Open the mailbox
        </a>
      )}
    </aside>
  );
}
