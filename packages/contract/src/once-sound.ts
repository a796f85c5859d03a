/** For `.refine`: asked only of what has passed so far, so that one mistake gets one sentence. */
export function onceSound(error: string) {
  return { error, when: ({ issues }: { issues: readonly unknown[] }) => issues.length === 0 };
}
