import { DomainError, InvalidInput } from '@hidewright/domain';
import { Notice } from '../../../components/notice.tsx';
import { hoursText, minutesText } from '../../../lib/formatting.ts';
import { waysFor, type Steps, type Way } from '../ways.ts';

interface WaysTableProps {
  steps: Steps;
  perContainer: number;
  /** As it is typed: anything may be missing. */
  asked: Record<string, unknown>;
}

const figure = 'py-1.5 pl-3 text-right align-top';

/** The three ways beside each other, or why they cannot be told. */
export function WaysTable(props: WaysTableProps) {
  const { ways, refusal } = waysOrWhyNot(props);
  if (refusal !== undefined) return <Notice>{refusal}</Notice>;
  return (
    <>
      <table aria-label="Ways of working" className="w-full text-sm sm:text-base">
        <thead>
          <tr className="text-sm text-ink-soft">
            <th scope="col" className="text-left font-normal">
              way
            </th>
            <Head>handling</Head>
            <Head>the run takes</Head>
            <Head>first ready</Head>
          </tr>
        </thead>
        <tbody>
          {ways.map((way) => (
            <WayRow key={way.name} way={way} />
          ))}
        </tbody>
      </table>
      <p className="text-sm text-ink-soft">
        From the steps as they are typed, setting up once each; rest and the time that pieces must
        lie come on top.
      </p>
    </>
  );
}

function Head({ children }: { children: string }) {
  return (
    <th scope="col" className={`${figure} font-normal`}>
      {children}
    </th>
  );
}

function WayRow({ way }: { way: Way }) {
  return (
    <tr className="stitched bg-[length:100%_2px] bg-top">
      <th scope="row" className="py-1.5 text-left font-semibold">
        {way.name}
        {way.cautions.map((caution) => (
          <span key={caution} className="block text-sm font-semibold text-oxblood">
            {caution}
          </span>
        ))}
      </th>
      <td className={figure}>{timeText(way.handlingSeconds / 60)}</td>
      <td className={figure}>{timeText(way.elapsedMinutes)}</td>
      <td className={figure}>{timeText(way.firstReadyMinutes)}</td>
    </tr>
  );
}

const timeText = (minutes: number): string =>
  minutes < 120 ? minutesText(minutes.toFixed(4)) : hoursText(minutes.toFixed(4));

function waysOrWhyNot({ steps, perContainer, asked }: WaysTableProps) {
  const whole = (name: string) => (typeof asked[name] === 'number' ? asked[name] : Number.NaN);
  try {
    const ways = waysFor(steps, perContainer, {
      pieces: whole('pieces'),
      transfer: whole('transfer'),
      handlingSeconds: whole('handlingSeconds'),
      hands: asked['hands'] === 'each' ? 'each' : 'one',
    });
    return { ways, refusal: undefined };
  } catch (error) {
    if (error instanceof DomainError) return { ways: [], refusal: inWords(error) };
    throw error;
  }
}

/** The domain names its own fields; here they have other words beside them. */
function inWords(error: DomainError): string {
  const field = error instanceof InvalidInput ? error.field : '';
  if (field === 'pieces') return 'Write the run as a whole number, from 1 to 100,000 pieces.';
  if (field.startsWith('batches')) return 'Write the batches as a whole number, 1 piece or more.';
  if (field === 'handlingSeconds') return 'Write the handling in whole seconds, 0 or more.';
  return error.message;
}
