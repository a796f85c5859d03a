import type { PressReply } from '@hidewright/contract';
import type { PressLimits } from '@hidewright/domain';

/** A press as the domain takes it. */
export function limitsOf(press: PressReply): PressLimits {
  const read = (text: string | null) => (text === null ? null : Number(text));
  return {
    bedWidthMm: Number(press.bedWidthMm),
    bedDepthMm: Number(press.bedDepthMm),
    throatMm: read(press.throatMm),
    ruleMm: read(press.ruleMm),
    reliefAreaMm2: read(press.reliefAreaMm2),
  };
}
