import type { OrderSuggestionReply } from '@hidewright/contract';
import { useId } from 'react';
import { Button } from '../../../components/button.tsx';
import { describedBy, Field } from '../../../components/field.tsx';
import { InputFrame, inputLook } from '../../../components/input-frame.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { soldWords } from '../to-order-words.ts';
import { signOf } from '../typed-quantity.ts';

interface OrderControlsProps {
  item: OrderSuggestionReply;
  text: string;
  wrong: boolean;
  /** Undefined where there are no others to draft it with. */
  ticked: boolean | undefined;
  busy: boolean;
  onText: (text: string) => void;
  onTick: (on: boolean) => void;
  onDraft: () => void;
}

/** How many, which may be changed; ticked for all at once, or drafted by itself. */
export function OrderControls(props: OrderControlsProps) {
  const { item, text, wrong, ticked, busy, onText, onTick, onDraft } = props;
  const workshop = useWorkshop();
  const id = useId();
  if (item.supplierId === null) return <NoSupplier item={item} />;
  const sold = soldWords(item, workshop);
  const unit = signOf(item, workshop);
  const help = sold && `sold in ${sold}`;
  const error = wrong ? 'Enter a quantity above 0.' : undefined;
  return (
    <div className="flex flex-wrap items-start gap-x-5 gap-y-3">
      <Field
        id={id}
        label={
          <>
            Order<span className="sr-only"> of {item.name}</span>
          </>
        }
        help={help}
        error={error}
      >
        <InputFrame id={id} unit={unit} short invalid={wrong}>
          <input
            id={id}
            inputMode={item.of === 'leather' ? 'text' : 'numeric'}
            autoComplete="off"
            value={text}
            onChange={(event) => onText(event.target.value)}
            aria-invalid={wrong}
            aria-describedby={describedBy(id, { unit, help, error })}
            className={inputLook}
          />
        </InputFrame>
      </Field>
      <div className="flex flex-wrap items-center gap-x-5 gap-y-2 sm:mt-7">
        <Button busy={busy} onClick={onDraft}>
          Put on the draft<span className="sr-only">: {item.name}</span>
        </Button>
        {ticked !== undefined && (
          <label className="flex min-h-11 items-center gap-2.5">
            <input
              type="checkbox"
              checked={ticked}
              onChange={(event) => onTick(event.target.checked)}
              className="size-4.5 accent-verdigris"
            />
            <span>
              with the others<span className="sr-only">: {item.name}</span>
            </span>
          </label>
        )}
      </div>
    </div>
  );
}

function NoSupplier({ item }: Pick<OrderControlsProps, 'item'>) {
  const to =
    item.of === 'leather' ? `/stockroom/leather/${item.id}` : `/stockroom/hardware/${item.id}`;
  return (
    <p>
      {'Nobody is named who sells it. '}
      <TextLink to={to}>Name a supplier</TextLink>
      {', then it can be drafted.'}
    </p>
  );
}
