import { z } from 'zod';

/** A record that the domain describes and worked out itself; it travels as it is. */
export function domainRecord<T extends object>(title: string) {
  return z
    .custom<T>((value) => typeof value === 'object' && value !== null)
    .meta({ type: 'object', title });
}
