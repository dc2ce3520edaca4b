import { useEffect, useRef } from 'react';
import { useForm, type DefaultValues, type FieldValues, type UseFormReturn } from 'react-hook-form';
import { draftPrefix } from '../../lib/drafts';
import { dropStored, readStored, writeStored } from '../../lib/stored';

export interface DraftForm<Values extends FieldValues> extends UseFormReturn<Values> {
  /** Whether what is shown was kept from an earlier visit. */
  restored: boolean;
  /** Forgets what was typed; called by `Form` once the server has it. */
  discardDraft: () => void;
}

interface DraftFormSettings<Values extends FieldValues> {
  /** Names the draft; with the thing's own code where a thing is edited: `part:CLAMP-N2`. */
  name: string;
  defaultValues: DefaultValues<Values>;
  /** Fields that are never kept: passwords and codes. */
  secret?: readonly (keyof Values & string)[];
}

/**
 * A form whose typed values are kept in this tab until they are sent, so that a reload, a lost connection or an expired
 * session loses nothing. They go with the tab, and when the person signs out.
 */
export function useDraftForm<Values extends FieldValues>(settings: DraftFormSettings<Values>): DraftForm<Values> {
  const { name, defaultValues, secret = [] } = settings;
  const key = draftPrefix + name;
  const kept = useRef(readStored('session', key) as Partial<Values> | undefined);
  const form = useForm<Values>({ defaultValues, mode: 'onTouched', shouldFocusError: false });
  const secrets = useRef(secret);
  useEffect(() => {
    const values = kept.current;
    if (values) form.reset(Object.assign({}, defaultValues, values), { keepDefaultValues: true });
    return form.subscribe({
      formState: { values: true, isDirty: true },
      callback: ({ values: typed, isDirty }) => {
        const open = Object.entries(typed).filter(([field]) => !secrets.current.includes(field));
        if (isDirty) writeStored('session', key, Object.fromEntries(open));
        else dropStored('session', key);
      },
    });
    // A form keeps the defaults it began with; another thing is another form, by its React key.
    // oxlint-disable-next-line react/exhaustive-deps
  }, [form, key]);
  return { ...form, restored: kept.current !== undefined, discardDraft: () => dropStored('session', key) };
}
