import { withRejects, type RunHardware, type RunInput } from '@hidewright/domain';
import type { QuoteBody } from './quote-body.ts';

/** A run as the pattern and the shop's values of today have it, and the options that the pattern has. */
export interface RunAsItStands {
  input: RunInput;
  options: { name: string; hardware: RunHardware[] }[];
}

type Asked = Pick<QuoteBody, 'breaks' | 'tooling' | 'overrides' | 'terms'>;

/**
 * The run that a quote asks for. The browser's preview and the saved quote are made by this one function, so that
 * they cannot differ by a cent. Options that the pattern does not have are left out.
 * @throws {InvalidInput} for rejects that cannot be
 */
export function runAsAsked(
  { input, options }: RunAsItStands,
  { breaks, tooling, overrides, terms }: Asked,
): RunInput {
  const { rejectPercent, leatherPricePerFt2 } = overrides;
  return {
    ...input,
    breaks,
    tooling,
    leather: {
      ...input.leather,
      pricePerFt2: leatherPricePerFt2 ?? input.leather.pricePerFt2,
    },
    work: rejectPercent === undefined ? input.work : withRejects(input.work, rejectPercent),
    history: rejectPercent === undefined ? (input.history ?? null) : null,
    priceRule: terms.priceRule ?? input.priceRule,
    floorPrice: terms.floorPrice,
    setUpCharge: terms.setUpCharge ?? input.setUpCharge,
    minimumOrder: terms.minimumOrder ?? input.minimumOrder,
    rushPercent: terms.rushPercent ?? '0',
    carriage: { cost: terms.carriageCost ?? '0', charge: terms.carriageCharge ?? '0' },
    resalePrice: terms.resalePrice,
    options: terms.options.flatMap(({ name, typedExtra }) => {
      const option = options.find((each) => each.name === name);
      return option === undefined ? [] : [{ ...option, typedExtra }];
    }),
  };
}
