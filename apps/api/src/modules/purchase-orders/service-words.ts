/** How a service is called where it stands by itself: "Dyeing of T-0012, Oak tan natural 7–8 oz". */
export function sayService({ service, tag, leather }: SaidService): string {
  return `${service.charAt(0).toUpperCase()}${service.slice(1)} of ${tag}, ${leather}`;
}

interface SaidService {
  service: string;
  tag: string;
  /** What it is before the work. */
  leather: string;
}
