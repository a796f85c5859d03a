import type { PlateOfferReply } from '@hidewright/contract';
import { useMemo, useState } from 'react';
import { Button } from '../../../components/button.tsx';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { countText, moneyText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { AddPlateOfferDialog } from './add-plate-offer-dialog.tsx';
import { ChangePlateOfferDialog } from './change-plate-offer-dialog.tsx';

/** What a new plate of each metal costs and lasts: the figures that the advice on metals reckons with. */
export function PlateOffers({ offers }: { offers: readonly PlateOfferReply[] }) {
  const { currency } = useWorkshop();
  const [changing, setChanging] = useState<PlateOfferReply>();
  const [adding, setAdding] = useState(false);
  const columns = useMemo(() => columnsFor(currency, setChanging), [currency]);
  return (
    <>
      <DataTable
        label="New plates"
        rows={offers}
        rowId={(row) => row.id}
        columns={columns}
        empty={
          <p className="text-ink-soft">
            No prices yet. Enter what your engraver asks for a plate of each metal and how many
            impressions one lasts: patterns then say which metal costs least for a run and its
            repeats.
          </p>
        }
      />
      <Button className="mt-3" onClick={() => setAdding(true)}>
        Add a metal
      </Button>
      {adding && <AddPlateOfferDialog offers={offers} onClose={() => setAdding(false)} />}
      {changing && (
        <ChangePlateOfferDialog
          key={changing.id}
          offer={changing}
          onClose={() => setChanging(undefined)}
        />
      )}
    </>
  );
}

function columnsFor(
  currency: string,
  onChange: (offer: PlateOfferReply) => void,
): Column<PlateOfferReply>[] {
  return [
    { id: 'metal', header: 'Metal', value: (row) => row.metal, onPhone: 'title' },
    {
      id: 'price',
      header: `Price, ${currency}`,
      value: (row) => Number(row.price),
      cell: (row) => moneyText(row.price),
      align: 'right',
    },
    {
      id: 'life',
      header: 'Lasts, impressions',
      value: (row) => row.lifeUses,
      cell: (row) => countText(row.lifeUses),
      align: 'right',
    },
    {
      id: 'change',
      header: 'Change',
      value: () => null,
      cell: (row) => (
        <Button onClick={() => onChange(row)}>
          Change<span className="sr-only"> {row.metal}</span>
        </Button>
      ),
      sortable: false,
    },
  ];
}
