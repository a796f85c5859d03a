import { Toast } from '@base-ui/react/toast';
import { X } from 'lucide-react';
import { toastManager } from './toast.ts';

/** Where what was just done is said; stands once, above everything. */
export function Toasts() {
  return (
    <Toast.Provider toastManager={toastManager}>
      <Toast.Portal>
        <Toast.Viewport className="no-print fixed right-4 bottom-20 z-60 flex w-[min(24rem,calc(100vw-2rem))] flex-col gap-2 md:right-6 md:bottom-6">
          <ToastList />
        </Toast.Viewport>
      </Toast.Portal>
    </Toast.Provider>
  );
}

function ToastList() {
  const { toasts } = Toast.useToastManager();
  return toasts.map((toast) => (
    <Toast.Root
      key={toast.id}
      toast={toast}
      swipeDirection={['right', 'down']}
      className="rounded border-l-4 border-verdigris bg-card shadow-top transition-opacity data-ending-style:opacity-0 data-limited:hidden data-starting-style:opacity-0"
    >
      <Toast.Content className="flex items-center gap-3 py-2 pr-2 pl-4">
        <Toast.Title render={<p />} className="grow" />
        <Toast.Action className="min-h-9 rounded px-3 font-semibold text-verdigris hover:bg-verdigris-pale" />
        <Toast.Close
          aria-label="Close"
          // It can be reached by Tab at any time, so it must not be hidden from the ear.
          aria-hidden={false}
          className="grid size-9 shrink-0 place-items-center rounded text-ink-soft hover:bg-manila"
        >
          <X size={18} aria-hidden="true" />
        </Toast.Close>
      </Toast.Content>
    </Toast.Root>
  ));
}
