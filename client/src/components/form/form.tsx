import Button from '@mui/material/Button';
import { styled } from '@mui/material/styles';
import type { FormEvent, ReactElement, ReactNode } from 'react';
import { FormProvider, type FieldValues } from 'react-hook-form';
import { ErrorSummary } from './error-summary';
import { FormFieldsContext } from './field-names';
import { StalePanel } from './stale-panel';
import type { DraftForm } from './use-draft-form';
import { useFormSending } from './use-form-sending';

const Frame = styled('form')(({ theme }) => ({
  display: 'grid',
  gridTemplateColumns: 'minmax(0, 1fr)',
  gap: 18,
  maxWidth: 640,
  '& .acts': { display: 'flex', flexWrap: 'wrap', gap: 10, marginTop: 6 },
  '& .kept': { margin: 0, fontSize: '0.8125rem', color: theme.vars.palette.tone.inkSoft },
  '& > fieldset': { border: 0, margin: 0, padding: 0, display: 'grid', gap: 18, minWidth: 0 },
  '& > fieldset > legend': { ...theme.typography.h2, padding: 0, marginBottom: 10 },
}));

interface FormProps<Values extends FieldValues> {
  form: DraftForm<Values>;
  /** Sends what was typed; a refusal is thrown as `ApiProblem` and lands on its fields. */
  onSubmit: (values: Values) => Promise<unknown>;
  /** Says the act: `Add the part`. */
  submitLabel: string;
  onCancel?: () => void;
  children: ReactNode;
  /** Names the form where the page has several. */
  label?: string;
  /** For tables to type in: as wide as the page. */
  wide?: boolean;
  /** What stands in the fields once the server has taken it. */
  after?: 'kept' | 'empty';
  /**
   * For a thing with a version, which the form holds as its value `version`: the form's values in another state of it.
   * They are taken from what `onSubmit` gives, and from what somebody else kept: an edit that collides shows both states
   * and lets the person choose.
   */
  valuesOf?: (current: unknown) => Values;
}

/** Every form: errors in a summary and beside their fields, nothing lost when it is refused, the act always below left. */
export function Form<Values extends FieldValues>(props: FormProps<Values>): ReactElement {
  const { form, onSubmit, submitLabel, onCancel, children, label, wide = false, after = 'kept', valuesOf } = props;
  const sending = useFormSending({ form, onSubmit, after, valuesOf });
  const { isSubmitting, isDirty } = form.formState;
  const submit = (event: FormEvent): void => {
    // A dialog's form sits inside the page's in React's tree; its submit is not the page's.
    event.stopPropagation();
    void sending.submit(event);
  };
  const cancel = (): void => {
    form.discardDraft();
    onCancel?.();
  };
  return (
    <FormProvider {...form}>
      <FormFieldsContext value={sending.fields}>
        <Frame noValidate aria-label={label} onSubmit={submit} style={wide ? { maxWidth: 'none' } : undefined}>
          <ErrorSummary attempt={sending.attempt} refusal={sending.refusal} />
          {sending.theirs ? (
            <StalePanel
              theirs={sending.theirs}
              mine={form.getValues()}
              onTakeTheirs={sending.takeTheirs}
              onKeepMine={sending.keepMine}
            />
          ) : null}
          {form.restored && isDirty ? (
            <p className="kept">
              This is what you typed before.{' '}
              <Button size="small" variant="text" onClick={sending.startAfresh}>
                Start afresh
              </Button>
            </p>
          ) : null}
          {children}
          <div className="acts">
            <Button type="submit" variant="contained" disabled={isSubmitting}>
              {submitLabel}
            </Button>
            {onCancel ? (
              <Button variant="text" onClick={cancel}>
                Cancel
              </Button>
            ) : null}
          </div>
        </Frame>
      </FormFieldsContext>
    </FormProvider>
  );
}
