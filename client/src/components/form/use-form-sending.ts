import { useId, useState } from 'react';
import type { DefaultValues, FieldValues, Path, PathValue } from 'react-hook-form';
import { ApiProblem, sentenceOf } from '../../lib/problem';
import type { FormFields } from './field-names';
import { placeFaults } from './server-faults';
import type { DraftForm } from './use-draft-form';

interface Sending<Values extends FieldValues> {
  form: DraftForm<Values>;
  onSubmit: (values: Values) => Promise<unknown>;
  after: 'kept' | 'empty';
  /** The form's values in another state of the thing; for things with a version. */
  valuesOf?: (current: unknown) => Values;
}

/** Sends a form, puts what the server refuses where it belongs, and knows when somebody else was faster. */
export function useFormSending<Values extends FieldValues>({ form, onSubmit, after, valuesOf }: Sending<Values>) {
  const prefix = useId();
  const [fields] = useState<FormFields>(() => ({ prefix, names: new Map() }));
  const [refusal, setRefusal] = useState<readonly string[]>([]);
  const [theirs, setTheirs] = useState<Values>();
  const [attempt, setAttempt] = useState(0);

  const refuse = (error: unknown): void => {
    if (error instanceof ApiProblem && error.code === 'changed_meanwhile' && error.current && valuesOf) {
      setTheirs(valuesOf(error.current));
      return;
    }
    if (!(error instanceof ApiProblem) || error.errors.length === 0) {
      setRefusal([sentenceOf(error).sentence]);
      return;
    }
    setRefusal(placeFaults(form, error, fields.names).map((fault) => fault.detail));
  };
  const send = async (values: Values): Promise<void> => {
    try {
      const kept = await onSubmit(values);
      form.discardDraft();
      if (after === 'empty') form.reset();
      else form.reset(valuesOf && kept ? valuesOf(kept) : values);
    } catch (error) {
      refuse(error);
    }
  };
  const submit = async (event?: React.BaseSyntheticEvent): Promise<void> => {
    setRefusal([]);
    setTheirs(undefined);
    await form.handleSubmit(send)(event);
    setAttempt((count) => count + 1);
  };
  const takeTheirs = (): void => {
    if (!theirs) return;
    form.discardDraft();
    form.reset(theirs);
    setTheirs(undefined);
  };
  const keepMine = (): void => {
    if (!theirs) return;
    const version = 'version' as Path<Values>;
    form.setValue(version, theirs.version as PathValue<Values, Path<Values>>);
    void submit();
  };
  const startAfresh = (): void => {
    form.discardDraft();
    form.reset(form.formState.defaultValues as DefaultValues<Values>);
  };
  return { fields, refusal, attempt, theirs, submit, takeTheirs, keepMine, startAfresh };
}
