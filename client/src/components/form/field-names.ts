import { createContext, use, useEffect } from 'react';

/** What a form knows of its fields: a page may hold two forms with fields of the same name. */
export interface FormFields {
  /** Begins the id of every field of this form. */
  prefix: string;
  /** The fields it really shows and what they are called, so that a fault of any other stands in the summary. */
  names: Map<string, string>;
}

export const FormFieldsContext = createContext<FormFields>({ prefix: 'field', names: new Map() });

/**
 * Makes a field known to its form.
 * @returns the id of its control, for its label, its error and the summary's link
 */
export function useFieldId(name: string, label: string = name): string {
  const { prefix, names } = use(FormFieldsContext);
  useEffect(() => {
    names.set(name, label);
    return () => {
      names.delete(name);
    };
  }, [names, name, label]);
  return fieldId(prefix, name);
}

export function fieldId(prefix: string, name: string): string {
  return `${prefix}-${name.replaceAll('.', '-')}`;
}
