import { useCallback, useRef } from 'react';

/**
 * For a list from which the row that was just pressed goes: the focus would go with it, so the list takes it, and Tab
 * goes on from there. The list has `tabIndex={-1}`.
 */
export function useFocusKept<List extends HTMLElement>() {
  const list = useRef<List>(null);
  const keepFocus = useCallback(() => list.current?.focus({ preventScroll: true }), []);
  return { list, keepFocus };
}
