import { useEffect, useRef, useState } from 'react';
import { openCamera, readCodes, whyNoCamera } from './camera-codes.ts';
import { Notice } from './notice.tsx';

/** The camera's picture while it looks for a code; it is switched off when this goes from the screen. */
export function CameraScanner({ onRead }: { onRead: (text: string) => void }) {
  const picture = useRef<HTMLVideoElement>(null);
  const [trouble, setTrouble] = useState<string>();
  const tell = useRef(onRead);
  useEffect(() => {
    tell.current = onRead;
  }, [onRead]);

  useEffect(() => {
    const closed = new AbortController();
    async function look() {
      try {
        const video = picture.current;
        if (video === null) return;
        await openCamera(video, closed.signal);
        await readCodes(video, closed.signal, (text) => tell.current(text));
      } catch (error) {
        if (!closed.signal.aborted) setTrouble(whyNoCamera(error));
      }
    }
    void look();
    return () => closed.abort();
  }, []);

  if (trouble !== undefined) {
    return (
      <Notice tone="attention" live title="The camera cannot be used.">
        {trouble}
      </Notice>
    );
  }
  return (
    <div className="relative max-w-xl overflow-hidden rounded bg-black">
      <video
        ref={picture}
        muted
        playsInline
        aria-label="What the camera sees: hold a code in front of it"
        className="aspect-4/3 w-full object-cover"
      />
      <div
        aria-hidden="true"
        className="pointer-events-none absolute inset-[18%] rounded border-3 border-dashed border-white/80"
      />
    </div>
  );
}
