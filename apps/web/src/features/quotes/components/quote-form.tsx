import { quoteBody, type QuoteBody, type QuoteTerms } from '@hidewright/contract';
import type { RunInput } from '@hidewright/domain';
import type { ReactNode } from 'react';
import type { z } from 'zod';
import { CustomerField } from '../../../components/customer-field.tsx';
import { Card } from '../../../components/card.tsx';
import { DayField } from '../../../components/day-field.tsx';
import { Form } from '../../../components/form.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import type { Choice } from '../../../components/select-field.tsx';
import { Stitch } from '../../../components/stitch.tsx';
import { TextArea } from '../../../components/text-area.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { usePreview } from '../use-preview.ts';
import { OptionFields } from './option-fields.tsx';
import { OverrideFields } from './override-fields.tsx';
import { PatternField } from './pattern-field.tsx';
import { QuotePreview } from './quote-preview.tsx';
import { RungFields } from './rung-fields.tsx';
import { TermsFields } from './terms-fields.tsx';
import { ToolingFields } from './tooling-fields.tsx';

export type TypedQuote = z.input<typeof quoteBody>;

interface QuoteFormProps {
  defaults: Partial<TypedQuote>;
  customers: readonly Choice[];
  /** A short form that adds a customer without leaving this page. */
  newCustomer: (onAdded: (id: number) => void) => ReactNode;
  patterns: readonly Choice[];
  /** What lies finished already of the pattern that is chosen. */
  shelf?: ((patternId: number, customerId: number | undefined) => ReactNode) | undefined;
  draftKey: string;
  submitWord: string;
  cancelTo: string;
  onSend: (body: TypedQuote) => Promise<unknown>;
  onReload?: () => Promise<Partial<TypedQuote>>;
}

/** A quote as it is typed, with its numbers beside it, worked out at every stroke. */
export function QuoteForm(props: QuoteFormProps) {
  const { defaults, draftKey, submitWord, cancelTo, onSend, onReload, ...fields } = props;
  return (
    <Form
      schema={quoteBody}
      defaults={defaults}
      draftKey={draftKey}
      submitWord={submitWord}
      onSend={onSend}
      {...(onReload && { onReload })}
      actions={
        <LinkButton to={cancelTo} tone="quiet">
          Leave it
        </LinkButton>
      }
    >
      <QuoteFields {...fields} />
    </Form>
  );
}

function QuoteFields({
  customers,
  newCustomer,
  patterns,
  shelf,
}: Pick<QuoteFormProps, 'customers' | 'newCustomer' | 'patterns' | 'shelf'>) {
  const { today } = useWorkshop();
  const { basis, preview } = usePreview();
  const numbers = preview && 'numbers' in preview ? preview.numbers : undefined;
  const workedOut = new Map(numbers?.breaks.map((rung) => [rung.quantity, rung.suggestedPrice]));
  return (
    <div className="grid items-start gap-5 xl:grid-cols-[minmax(0,34rem)_minmax(0,1fr)]">
      <Card>
        <div className="space-y-5">
          <CustomerField choices={customers} newCustomer={newCustomer} />
          <PatternField choices={patterns} shelf={shelf} />
          <TextField
            name="title"
            label="What the customer calls it"
            optional
            help="The pattern’s name, if left empty."
          />
          <DayField
            name="inHandsOn"
            label="In hands"
            optional
            min={today}
            whenEmpty="null"
            help="The day the goods must be with the customer."
          />
          <Stitch />
          <RungFields workedOut={workedOut} />
          <Stitch />
          <ToolingFields suggestions={toolsFor(basis)} />
          <Stitch />
          <OptionFields basis={basis} numbers={numbers} />
          <TermsFields basis={basis} />
          <OverrideFields basis={basis} />
          <TextArea name="message" label="Message to the customer" rows={3} optional />
        </div>
      </Card>
      <QuotePreview basis={basis} preview={preview} />
    </div>
  );
}

function toolsFor(basis: { needsDie: boolean; needsPlate: boolean } | undefined): string[] {
  return [
    ...(basis?.needsDie ? ['Cutting die'] : []),
    ...(basis?.needsPlate ? ['Stamp plate'] : []),
  ];
}

/** A saved quote as it would be typed. */
export function typedOf(quote: {
  customerId: number;
  patternId: number;
  title: string;
  inHandsOn: string | null;
  breaks: readonly { quantity: number; typedPrice?: string | null | undefined }[];
  input?: Pick<RunInput, 'breaks'> | undefined;
  terms?: QuoteTerms | undefined;
  tooling: readonly { name: string; cost?: string | undefined; charge?: string | undefined }[];
  message?: string | undefined;
  overrides: QuoteBody['overrides'];
}): TypedQuote {
  return {
    customerId: quote.customerId,
    patternId: quote.patternId,
    title: quote.title,
    inHandsOn: quote.inHandsOn,
    breaks: quote.breaks.map(({ quantity, typedPrice }) => ({
      quantity,
      typedPrice: typedPrice ?? null,
      rule: quote.input?.breaks.find((each) => each.quantity === quantity)?.rule ?? null,
    })),
    terms: quote.terms,
    tooling: quote.tooling.map(({ name, cost = '0', charge = '0' }) => ({ name, cost, charge })),
    message: quote.message ?? '',
    overrides: quote.overrides,
  };
}
