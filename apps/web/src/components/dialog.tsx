import { Dialog as Primitive } from '@base-ui/react/dialog';
import { X } from 'lucide-react';
import type { ReactNode } from 'react';
import { dialogLook } from './dialog-look.ts';

interface DialogProps {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  title: ReactNode;
  description?: ReactNode | undefined;
  children: ReactNode;
}

/** Something small that is done without leaving the place, such as a short form. */
export function Dialog({ open, onOpenChange, title, description, children }: DialogProps) {
  return (
    <Primitive.Root open={open} onOpenChange={onOpenChange}>
      <Primitive.Portal>
        <Primitive.Backdrop className={dialogLook.backdrop} />
        <Primitive.Popup className={dialogLook.popup}>
          <div className="mb-4 flex items-start justify-between gap-4">
            <Primitive.Title>{title}</Primitive.Title>
            <Primitive.Close
              aria-label="Close"
              className="-mt-1 -mr-2 grid size-9 place-items-center rounded hover:bg-manila"
            >
              <X size={20} aria-hidden="true" />
            </Primitive.Close>
          </div>
          {description && (
            <Primitive.Description className="mb-4 text-ink-soft">
              {description}
            </Primitive.Description>
          )}
          {children}
        </Primitive.Popup>
      </Primitive.Portal>
    </Primitive.Root>
  );
}
