interface ReceivedLegendProps {
  /** Whether the order has nothing of this kind and nothing of it was entered: then only a reader hears it. */
  aside: boolean;
  children: string;
}

/** The name of one kind of things that came; out of the way where none of it was to come. */
export function ReceivedLegend({ aside, children }: ReceivedLegendProps) {
  return <legend className={aside ? 'sr-only' : 'mb-3 text-lg font-semibold'}>{children}</legend>;
}
