import { useEffect, useMemo, useState } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import {
  drawnOutline,
  openDrawing,
  type DrawnOutline,
  type OpenedDrawing,
} from './drawn-outline.ts';

const outline = 'definition.outline';

export interface UsedDrawing {
  /** The file that was opened last, if it could be read. */
  opened: OpenedDrawing | undefined;
  /** What comes of it. */
  drawn: DrawnOutline | undefined;
  /** Why the file chosen last could not be read; the one before it stays. */
  refusal: string | undefined;
  open: (file: File) => Promise<void>;
}

/** The drawing that an outline is taken from. What comes of it goes into the form; the file itself is never sent. */
export function useDrawing(): UsedDrawing {
  const { setValue, clearErrors } = useFormContext();
  const [opened, setOpened] = useState<OpenedDrawing>();
  const [refusal, setRefusal] = useState<string>();
  const [curve, kept, knownWidthMm] = useWatch({
    name: [`${outline}.curve`, `${outline}.kept`, `${outline}.knownWidthMm`],
  }) as unknown[];
  const drawn = useMemo(
    () => opened && drawnOutline(opened, { curve, kept, knownWidthMm }),
    [opened, curve, kept, knownWidthMm],
  );

  useEffect(() => {
    if (drawn === undefined) return;
    setValue(`${outline}.points`, drawn.outline?.points, { shouldDirty: true });
    setValue(`${outline}.punched`, drawn.outline?.punched, { shouldDirty: true });
    if (drawn.outline) clearErrors([`${outline}.points`, `${outline}.punched`]);
  }, [drawn, setValue, clearErrors]);

  async function open(file: File): Promise<void> {
    const found = openDrawing(file.name, await file.text());
    setRefusal(typeof found === 'string' ? found : undefined);
    if (typeof found === 'string') return;
    setValue(`${outline}.curve`, found.drawing.likely, { shouldDirty: true });
    setValue(`${outline}.kept`, {}, { shouldDirty: true });
    setValue(`${outline}.knownWidthMm`, '', { shouldDirty: true });
    setOpened(found);
  }

  return { opened, drawn, refusal, open };
}
