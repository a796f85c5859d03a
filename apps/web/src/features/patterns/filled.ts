/** Leaves out whatever was left empty. */
export function filled(typed: Record<string, unknown>): Record<string, unknown> {
  return Object.fromEntries(
    Object.entries(typed).filter(([, value]) => value !== undefined && value !== ''),
  );
}

/** Of what a form holds, the fields that are named. */
export function pick(typed: Record<string, unknown>, names: readonly string[]) {
  return Object.fromEntries(names.map((name) => [name, typed[name]]));
}
