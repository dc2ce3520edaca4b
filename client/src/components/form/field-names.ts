import { createContext, use, useEffect } from 'react';

/** The fields a form really shows, so that a fault of any other stands in the summary. */
export const FieldNames = createContext<Set<string>>(new Set());

export function useFieldName(name: string): void {
  const names = use(FieldNames);
  useEffect(() => {
    names.add(name);
    return () => {
      names.delete(name);
    };
  }, [names, name]);
}

/** The id of a field's control, for its label, its error and the summary's link. */
export function fieldId(name: string): string {
  return `field-${name.replaceAll('.', '-')}`;
}
