import { useEffect, useRef } from 'react';
import { useLocation } from 'react-router-dom';

/** After each move the new place's title takes the focus, so that it is read out and Tab begins there. */
export function useFocusAfterMove() {
  const { pathname } = useLocation();
  const last = useRef(pathname);
  useEffect(() => {
    if (last.current === pathname) return;
    last.current = pathname;
    focusTitle();
  }, [pathname]);
}

/** For a page that becomes another at the same address. */
export function focusTitle(): void {
  const title = document.querySelector<HTMLElement>('main h1') ?? document.getElementById('main');
  title?.focus({ preventScroll: true });
}
