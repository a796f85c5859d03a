import { lengthBetween } from '@hidewright/contract';
import { useState } from 'react';
import { z } from 'zod';
import { Form } from '../../../components/form.tsx';
import { LengthField } from '../../../components/length-field.tsx';
import { Notice } from '../../../components/notice.tsx';

interface PhotoScaleFormProps {
  /** Whether there is a line with two ends. */
  drawn: boolean;
  /** Sets the scale; false where the line is too short for it. */
  onLength: (lengthMm: number) => boolean;
}

const known = z.strictObject({ lengthMm: lengthBetween('length of the line', 1, 6000) });

/** How long the line on the photo is in truth. */
export function PhotoScaleForm({ drawn, onLength }: PhotoScaleFormProps) {
  const [answer, setAnswer] = useState<{ right: boolean; sentence: string }>();

  function set(lengthMm: number): void {
    if (!drawn) setAnswer({ right: false, sentence: 'Draw the line on the photo first.' });
    else if (onLength(lengthMm))
      setAnswer({ right: true, sentence: 'The photo is true to scale.' });
    else setAnswer({ right: false, sentence: 'The line is too short. Draw a longer one.' });
  }

  return (
    <>
      <p className="text-sm text-ink-soft">
        Draw a line over something whose length you know, such as a rule beside the side; the
        longer, the truer. With the keyboard: arrow keys, Enter at each end.
      </p>
      <Form
        schema={known}
        defaults={{ lengthMm: '' }}
        submitWord="Set the scale"
        submitTone="secondary"
        onSend={async ({ lengthMm }) => set(Number(lengthMm))}
      >
        <LengthField name="lengthMm" label="Length of the line" whenEmpty="text" />
      </Form>
      {answer && (
        <Notice tone={answer.right ? 'ok' : 'attention'} live>
          {answer.sentence}
        </Notice>
      )}
    </>
  );
}
