import { useEffect } from 'react';

const retryMs = 10_000;

/** Sends at once, when the device is on the network again, and now and then. */
export function useResending(send: () => Promise<void>): void {
  useEffect(() => {
    const again = () => void send();
    again();
    window.addEventListener('online', again);
    const timer = setInterval(again, retryMs);
    return () => {
      window.removeEventListener('online', again);
      clearInterval(timer);
    };
  }, [send]);
}
