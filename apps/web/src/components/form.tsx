import { zodResolver } from '@hookform/resolvers/zod';
import { useId, useState, type ReactNode } from 'react';
import { FormProvider, useForm, type FieldValues } from 'react-hook-form';
import type { z } from 'zod';
import { ApiProblem } from '../lib/api-problem.ts';
import { Button } from './button.tsx';
import { ErrorSummary } from './error-summary.tsx';
import { fieldId, FormIdContext } from './form-context.ts';
import { formField, listErrors } from './form-errors.ts';
import { Notice } from './notice.tsx';
import { StaleNotice } from './stale-notice.tsx';
import type { Unfinished } from './unfinished.ts';
import { useFormDraft } from './use-form-draft.ts';

type BodySchema = z.ZodType<FieldValues, FieldValues>;

export interface FormProps<Schema extends BodySchema> {
  /** The endpoint's own body, from the contract. */
  schema: Schema | undefined;
  defaults: Unfinished<z.input<Schema>>;
  /** Sends it; whatever it throws is shown, and what was typed stays. */
  onSend: (values: z.input<Schema>) => Promise<unknown>;
  submitWord: string;
  submitTone?: 'primary' | 'secondary' | 'danger' | undefined;
  submitSize?: 'normal' | 'bench' | undefined;
  /** Beside the submit button, such as a link back. */
  actions?: ReactNode | undefined;
  /** Under which it survives a reload; none for what must not be kept, such as passwords. */
  draftKey?: string | undefined;
  /** For an edit: reads the thing again after somebody else changed it, and gives what is there now. */
  onReload?: (() => Promise<Unfinished<z.input<Schema>>>) | undefined;
  /** Starts again with the defaults once it was sent, for adding one after the other. */
  again?: boolean | undefined;
  children: ReactNode;
}

/** One column of fields, checked by the contract here and by the API there, with the same sentences. */
export function Form<Schema extends BodySchema>(props: FormProps<Schema>) {
  // Another draft is another form: nothing typed into this one may show there.
  return <TypedForm key={props.draftKey} {...props} />;
}

function TypedForm<Schema extends BodySchema>(props: FormProps<Schema>) {
  const { schema, defaults, onSend, draftKey, children } = props;
  if (!schema) throw new Error('This endpoint takes no body, so it has no form');
  const id = useId();
  const [problem, setProblem] = useState<ApiProblem>();
  const form = useForm<FieldValues>({
    resolver: zodResolver<FieldValues, unknown, FieldValues>(schema, undefined, { raw: true }),
    defaultValues: defaults as FieldValues,
    shouldFocusError: false,
  });
  const draft = useFormDraft(form, draftKey);
  const { errors, isSubmitting, submitCount } = form.formState;

  async function submit(values: FieldValues) {
    setProblem(undefined);
    try {
      await onSend(values as z.input<Schema>);
      draft.forget();
      if (props.again) form.reset(defaults as FieldValues);
    } catch (error) {
      const refusal = refusalOf(error);
      setProblem(refusal);
      for (const { field, message } of refusal.fieldErrors) {
        form.setError(formField(field), { type: 'server', message });
      }
    }
  }

  async function takeTheirs() {
    form.reset((await props.onReload?.()) as FieldValues | undefined);
    draft.forget();
    setProblem(undefined);
  }

  async function keepMine() {
    await props.onReload?.();
    setProblem(undefined);
  }

  function startAfresh() {
    form.reset(defaults as FieldValues);
    draft.forget();
  }

  const listed = listErrors(errors).map(({ field, message }) => ({
    fieldId: fieldId(id, field),
    message,
  }));
  const stale = problem?.status === 412;
  // What is said of a field that was just left has no need of a summary yet.
  const failed = (submitCount > 0 && listed.length > 0) || (problem !== undefined && !stale);
  return (
    <FormProvider {...form}>
      <FormIdContext value={id}>
        <form
          noValidate
          aria-busy={isSubmitting}
          className="space-y-5"
          onSubmit={(event) => {
            event.preventDefault();
            event.stopPropagation();
            if (!isSubmitting) void form.handleSubmit(submit)(event);
          }}
        >
          {failed && (
            <ErrorSummary
              attempt={submitCount}
              title={
                problem && problem.fieldErrors.length === 0
                  ? problem.detail
                  : titleFor(listed.length)
              }
              errors={listed}
            />
          )}
          {stale && <StaleNotice changed={problem.changed} onKeep={keepMine} onTake={takeTheirs} />}
          {draft.restored && (
            <Notice actions={<Button onClick={startAfresh}>Start afresh</Button>}>
              What you typed earlier is still here; it was not sent yet.
            </Notice>
          )}
          {children}
          <div className="flex flex-wrap items-center gap-3 pt-1">
            <Button
              type="submit"
              tone={props.submitTone ?? 'primary'}
              size={props.submitSize}
              busy={isSubmitting}
            >
              {props.submitWord}
            </Button>
            {props.actions}
          </div>
        </form>
      </FormIdContext>
    </FormProvider>
  );
}

/** A fault of ours is reported, and told in words all the same. */
function refusalOf(error: unknown): ApiProblem {
  if (error instanceof ApiProblem) return error;
  reportError(error);
  return new ApiProblem({ status: 500, detail: 'This could not be sent. Try again in a moment.' });
}

function titleFor(count: number): string {
  return count === 1 ? 'One thing must change first' : `${count} things must change first`;
}
