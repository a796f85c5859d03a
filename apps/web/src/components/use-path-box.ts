import { useLayoutEffect, useRef, useState } from 'react';

export interface PathBox {
  x: number;
  y: number;
  width: number;
  height: number;
}

const nothing: PathBox = { x: 0, y: 0, width: 0, height: 0 };

/** The box around a drawn path, in the drawing's own units, as the browser measures it. */
export function usePathBox(path: string) {
  const element = useRef<SVGPathElement>(null);
  const [box, setBox] = useState(nothing);
  useLayoutEffect(() => {
    if (!element.current) return;
    const { x, y, width, height } = element.current.getBBox();
    setBox({ x, y, width, height });
  }, [path]);
  return [element, box] as const;
}
