import { useState } from 'react';
import { Button } from '../../../components/button.tsx';

/** Puts a text on the clipboard, and says whether that worked. */
export function CopyButton({ text, word }: { text: string; word: string }) {
  const [said, setSaid] = useState('');
  async function copy() {
    try {
      await navigator.clipboard.writeText(text);
      setSaid('Copied.');
    } catch {
      setSaid('Select the text and copy it.');
    }
  }
  return (
    <span className="inline-flex flex-wrap items-center gap-2">
      <Button onClick={() => void copy()}>{word}</Button>
      <span role="status" className="text-sm text-ink-soft">
        {said}
      </span>
    </span>
  );
}
