import { AlertDialog } from '@base-ui/react/alert-dialog';
import { useState, type ReactNode } from 'react';
import { ApiProblem } from '../lib/api-problem.ts';
import { Button } from './button.tsx';
import { dialogLook } from './dialog-look.ts';
import { Notice } from './notice.tsx';

interface ConfirmDialogProps {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  /** The question: "Issue invoice for 420.00?" */
  title: string;
  /** The consequence, in words: "It gets the next number and cannot be changed afterwards…" */
  children: ReactNode;
  /** The act itself, as a verb: "Issue the invoice". */
  confirmWord: string;
  cancelWord?: string | undefined;
  /** Where asking the same again is refused again: what to do then, which leads back to the page. */
  refusedWord?: string | undefined;
  tone?: 'primary' | 'danger' | undefined;
  /** It stays open until this is done; what it throws is shown. */
  onConfirm: () => Promise<unknown>;
}

/** Asks before what cannot be undone. What can be undone is not asked about: see `undoable` in toasts. */
export function ConfirmDialog(props: ConfirmDialogProps) {
  const {
    open,
    onOpenChange,
    title,
    children,
    confirmWord,
    cancelWord = 'Leave it',
    tone,
    refusedWord,
  } = props;
  const [busy, setBusy] = useState(false);
  const [problem, setProblem] = useState<string>();
  const [settled, setSettled] = useState(false);

  async function confirm() {
    setBusy(true);
    setProblem(undefined);
    setSettled(false);
    try {
      await props.onConfirm();
      onOpenChange(false);
    } catch (error) {
      setProblem(error instanceof ApiProblem ? error.detail : 'That did not work. Try again.');
      setSettled(error instanceof ApiProblem && isSettled(error));
    } finally {
      setBusy(false);
    }
  }

  function change(next: boolean) {
    // Asked again, it starts afresh.
    setProblem(undefined);
    setSettled(false);
    onOpenChange(next);
  }

  return (
    <AlertDialog.Root open={open} onOpenChange={change}>
      <AlertDialog.Portal>
        <AlertDialog.Backdrop className={dialogLook.backdrop} />
        <AlertDialog.Popup className={dialogLook.popup}>
          <AlertDialog.Title>{title}</AlertDialog.Title>
          <AlertDialog.Description render={<div />} className="mt-2 mb-5">
            {children}
          </AlertDialog.Description>
          {problem && (
            <Notice tone="danger" live className="mb-5">
              {problem}
            </Notice>
          )}
          <div className="flex flex-wrap justify-end gap-2">
            {settled && refusedWord !== undefined ? (
              <AlertDialog.Close render={<Button tone="primary">{refusedWord}</Button>} />
            ) : (
              <>
                <AlertDialog.Close render={<Button>{cancelWord}</Button>} />
                <Button tone={tone ?? 'primary'} busy={busy} onClick={() => void confirm()}>
                  {confirmWord}
                </Button>
              </>
            )}
          </div>
        </AlertDialog.Popup>
      </AlertDialog.Portal>
    </AlertDialog.Root>
  );
}

/** It is another thing now, or in a state that does not allow it: the same question gets the same answer. */
const isSettled = ({ status }: ApiProblem): boolean => status === 409 || status === 412;
