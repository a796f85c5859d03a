import { countedWords, unitWord } from '@hidewright/domain';
import type { Hardware } from '@hidewright/contract';
import { KeyFigures } from '../../../components/key-figures.tsx';
import { lengthText, moneyText, askedPriceText } from '../../../lib/formatting.ts';
import { lengthFigure } from '../../../lib/units.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

/** The counts, large; then what it costs and who sells it; then what it is and how it is set. */
export function HardwareFacts({ hardware }: { hardware: Hardware }) {
  const { unit, parts } = hardware;
  const isKit = parts.length > 0;
  const counts = [
    { word: isKit ? 'Whole kits its parts make up' : 'On hand', count: hardware.onHand },
    { word: 'Held for jobs', count: hardware.reserved },
    { word: 'Free', count: hardware.free },
    { word: 'On order', count: hardware.onOrder },
  ];
  return (
    <div className="space-y-5">
      <KeyFigures
        large
        figures={counts.map(({ word, count }) => ({ word, figure: countedWords(count, unit) }))}
      />
      <Buying hardware={hardware} isKit={isKit} />
      <Details hardware={hardware} />
    </div>
  );
}

function Buying({ hardware, isKit }: { hardware: Hardware; isKit: boolean }) {
  const { currency } = useWorkshop();
  const { unit, unitPrice, valueOnHand, priceFromParts, fromCustomer } = hardware;
  const bought = [
    { word: 'Keep at least', figure: countedWords(hardware.reorderAt, unit) },
    { word: 'In packs of', figure: countedWords(hardware.packSize, unit) },
    {
      word: 'Supplier',
      figure: fromCustomer ? 'the customer brings it' : (hardware.supplierName ?? '–'),
    },
  ];
  const prices = [
    unitPrice !== undefined &&
      !fromCustomer && {
        word: `Price, ${currency}${unit === 'piece' ? '' : ` per ${unitWord(unit)}`}`,
        figure: askedPriceText(unitPrice),
        note: isKit && priceFromParts ? 'what its parts cost' : undefined,
      },
    valueOnHand !== undefined &&
      !isKit && { word: `On hand at cost, ${currency}`, figure: moneyText(valueOnHand) },
  ].filter((each) => each !== false);
  return <KeyFigures figures={[...(isKit ? [] : bought), ...prices]} />;
}

function Details({ hardware }: { hardware: Hardware }) {
  const { lengthUnit } = useWorkshop();
  const { metal, colour, bin, postLengthMm, stackMinMm, stackMaxMm, settingDie } = hardware;
  const length = (mm: string) => lengthText(mm, lengthUnit, lengthUnit === 'mm' ? 2 : 3);
  const stack =
    stackMaxMm !== null &&
    (stackMinMm === null ? 'up to ' : `${lengthFigure(stackMinMm, lengthUnit, 3)} to `) +
      length(stackMaxMm);
  const figures = [
    { word: 'Metal', figure: metal },
    { word: 'Colour', figure: colour },
    { word: 'Place', figure: bin },
    { word: 'Post', figure: postLengthMm !== null && length(postLengthMm) },
    { word: 'Holds a stack of', figure: stack },
    {
      word: 'Setting die',
      figure: settingDie,
      note: hardware.settingDieHere ? undefined : 'not in the shop',
    },
  ].filter(({ figure }) => figure !== '' && figure !== false);
  return figures.length > 0 && <KeyFigures figures={figures} />;
}
