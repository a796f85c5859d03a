import { Toast } from '@base-ui/react/toast';

export const toastManager = Toast.createToastManager();

/** Says what was just done: "Lot OT-121 is on the rack." */
export function say(sentence: string): void {
  toastManager.add({ title: sentence, timeout: 6000 });
}

/** Says what was just done and offers to take it back, instead of asking beforehand. */
export function undoable(sentence: string, undo: () => Promise<unknown> | void): void {
  const id = toastManager.add({
    title: sentence,
    timeout: 12_000,
    actionProps: {
      children: 'Undo',
      onClick: () => {
        toastManager.close(id);
        void undo();
      },
    },
  });
}
