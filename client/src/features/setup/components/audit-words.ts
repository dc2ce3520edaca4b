import type { AuditEntry } from '../api/audit';

/** `user.role_changed` as words: `user: role changed`. Actions are named by the server in the trade's words. */
export function actionWords(action: string): string {
  return action.replaceAll('_', ' ').replace('.', ': ');
}

const subjectNames: Readonly<Record<string, string>> = {
  app_user: 'person',
  shop: 'the shop',
  shop_closed_day: 'closed day',
  outbox_mail: 'mail',
};

export function subjectWords({ subjectKind, subjectCode, subjectId }: AuditEntry): string {
  return [
    subjectNames[subjectKind] ?? subjectKind.replaceAll('_', ' '),
    subjectCode ?? (subjectId === null ? '' : `no. ${subjectId}`),
  ]
    .join(' ')
    .trim();
}

export interface Change {
  field: string;
  before: string;
  after: string;
}

function shown(value: unknown): string {
  if (value === undefined || value === null) return '';
  return typeof value === 'string' ? value : JSON.stringify(value);
}

/** `unitCost` as words: `unit cost`. */
function fieldWords(field: string): string {
  return field
    .replace(/([a-z])([A-Z])/g, (_, left: string, right: string) => `${left} ${right.toLowerCase()}`)
    .replaceAll('_', ' ');
}

/** Every field that either state has, in the order they were recorded. */
export function changesOf({ before, after }: Pick<AuditEntry, 'before' | 'after'>): readonly Change[] {
  const fields = [...new Set([...Object.keys(before ?? {}), ...Object.keys(after ?? {})])];
  return fields.map((field) => ({
    field: fieldWords(field),
    before: shown(before?.[field]),
    after: shown(after?.[field]),
  }));
}
