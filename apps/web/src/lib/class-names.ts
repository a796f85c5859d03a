/** Joins the class names that apply. */
export function classNames(...names: (string | false | undefined | null)[]): string {
  return names.filter(Boolean).join(' ');
}
