import { readStockLevelsFile, type StockLevels } from '@hidewright/contract';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useId } from 'react';
import { useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import { buttonLook } from '../../../components/button-look.ts';
import { Card } from '../../../components/card.tsx';
import { InputFrame, inputLook } from '../../../components/input-frame.tsx';
import { KeyFigures } from '../../../components/key-figures.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import {
  HardwareLevels,
  KitLevels,
  LeatherLevels,
} from '../../../features/stock/components/levels-tables.tsx';
import { levelsQuery } from '../../../features/stock/stock.queries.ts';
import { addressOf } from '../../../lib/api.ts';
import { rackAreaText, moneyText } from '../../../lib/formatting.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { StockroomNav } from './stockroom-nav.tsx';

const wanted = (search: URLSearchParams) => {
  const on = search.get('on');
  return on !== null && /^\d{4}-\d{2}-\d{2}$/.test(on) ? { on } : {};
};

export async function loader({ request }: LoaderFunctionArgs) {
  await queryClient.ensureQueryData(levelsQuery(wanted(new URL(request.url).searchParams)));
  return null;
}

export function Component() {
  const [search, setSearch] = useSearchParams();
  const asked = wanted(search);
  const { data: levels } = useSuspenseQuery(levelsQuery(asked));
  const workshop = useWorkshop();
  const { currency, today } = workshop;
  const id = useId();
  const worth =
    levels.value === undefined
      ? []
      : [
          { word: `Leather, ${currency}`, figure: moneyText(levels.leatherValue ?? '0') },
          { word: `Hardware, ${currency}`, figure: moneyText(levels.hardwareValue ?? '0') },
          { word: `Together, ${currency}`, figure: moneyText(levels.value) },
        ];
  return (
    <>
      <PageHeader
        title="On hand"
        subtitle="What there was at the end of a day"
        action={
          <a
            href={addressOf(readStockLevelsFile, { query: asked })}
            download
            className={buttonLook({})}
          >
            Spreadsheet
          </a>
        }
      />
      <StockroomNav />
      <div className="mb-5">
        <label htmlFor={id} className="mb-1 block font-semibold">
          End of
        </label>
        <InputFrame id={id} invalid={false} short>
          <input
            id={id}
            type="date"
            max={today}
            value={levels.on}
            onChange={(event) => {
              const { value } = event.target;
              if (value !== '' && value <= today) setSearch(value === today ? {} : { on: value });
            }}
            className={inputLook}
          />
        </InputFrame>
      </div>
      <div className="grid gap-5">
        <Card>
          <KeyFigures
            large
            figures={[
              { word: 'Leather', figure: rackAreaText(levels.leatherAreaMm2, workshop) },
              ...worth,
            ]}
          />
          {levels.out.length > 0 && <OutBeside levels={levels} />}
        </Card>
        <Card title="Leather">
          <LeatherLevels levels={levels} />
        </Card>
        <Card title="Hardware and supplies">
          <HardwareLevels levels={levels} />
          {levels.kits.length > 0 && <KitLevels kits={levels.kits} />}
        </Card>
      </div>
    </>
  );
}

/** The shop's own still, and on no rack. */
function OutBeside({ levels: { out, outAreaMm2, outValue } }: { levels: StockLevels }) {
  const workshop = useWorkshop();
  const worth =
    outValue === undefined ? '' : `, ${workshop.currency} ${moneyText(outValue)} at cost`;
  return (
    <div className="mt-4 text-ink-soft">
      <p>{`Beside it ${rackAreaText(outAreaMm2, workshop)} of leather is out to be worked on${worth}:`}</p>
      <ul className="mt-1 list-disc pl-5">
        {out.map((each) => (
          <li key={`${each.purchaseOrderNumber} ${each.tag}`}>
            <TextLink to={`/stockroom/lots/${each.lotId}`}>{each.tag}</TextLink>
            {` ${each.leatherName}, ${rackAreaText(each.areaMm2, workshop)}: ${each.service} with ${each.supplierName}, ${each.purchaseOrderNumber}`}
          </li>
        ))}
      </ul>
    </div>
  );
}

export const ErrorBoundary = RouteError;
