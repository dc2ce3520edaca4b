import Button from '@mui/material/Button';
import { styled } from '@mui/material/styles';
import { useId, useState, type FormEvent, type ReactElement, type ReactNode } from 'react';
import { FormProvider, type FieldValues } from 'react-hook-form';
import { ApiProblem, sentenceOf } from '../../lib/problem';
import { ErrorSummary } from './error-summary';
import { FormFieldsContext } from './field-names';
import { placeFaults } from './server-faults';
import type { DraftForm } from './use-draft-form';

const Frame = styled('form')(({ theme }) => ({
  display: 'grid',
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
}

/** Every form: errors in a summary and beside their fields, nothing lost when it is refused, the act always below left. */
export function Form<Values extends FieldValues>({
  form,
  onSubmit,
  submitLabel,
  onCancel,
  children,
  label,
  wide = false,
  after = 'kept',
}: FormProps<Values>): ReactElement {
  const prefix = useId();
  const [fields] = useState(() => ({ prefix, names: new Set<string>() }));
  const [refusal, setRefusal] = useState<readonly string[]>([]);
  const [attempt, setAttempt] = useState(0);
  const { isSubmitting } = form.formState;

  const send = async (values: Values): Promise<void> => {
    try {
      await onSubmit(values);
      form.discardDraft();
      form.reset(after === 'empty' ? undefined : values);
    } catch (error) {
      setRefusal(refusalOf(error));
    }
  };
  const refusalOf = (error: unknown): readonly string[] => {
    if (!(error instanceof ApiProblem) || error.errors.length === 0) return [sentenceOf(error).sentence];
    const homeless = placeFaults(form, error, fields.names);
    return homeless.length > 0 ? homeless.map((fault) => fault.detail) : [];
  };
  const submit = (event: FormEvent): void => {
    // A dialog's form sits inside the page's in React's tree; its submit is not the page's.
    event.stopPropagation();
    setRefusal([]);
    void form
      .handleSubmit(send)(event)
      .then(() => setAttempt((count) => count + 1));
  };
  const startAfresh = (): void => {
    form.discardDraft();
    form.reset(form.formState.defaultValues as Values);
  };
  return (
    <FormProvider {...form}>
      <FormFieldsContext value={fields}>
        <Frame noValidate aria-label={label} onSubmit={submit} style={wide ? { maxWidth: 'none' } : undefined}>
          <ErrorSummary attempt={attempt} refusal={refusal} />
          {form.restored && form.formState.isDirty ? (
            <p className="kept">
              This is what you typed before.{' '}
              <Button size="small" variant="text" onClick={startAfresh}>
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
              <Button
                variant="text"
                onClick={() => {
                  form.discardDraft();
                  onCancel();
                }}
              >
                Cancel
              </Button>
            ) : null}
          </div>
        </Frame>
      </FormFieldsContext>
    </FormProvider>
  );
}
