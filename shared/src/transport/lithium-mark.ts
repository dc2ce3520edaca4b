import { isKnown } from './lithium-content-check.js';
import type { LithiumContent, LithiumParcel } from './lithium-parcel.js';
import type { LithiumEdition, LithiumRule } from './lithium-rules.js';

interface Mark {
  readonly required: boolean;
  readonly unNumbers: readonly string[];
  readonly rule: string;
}

const totalOf = (contents: readonly LithiumContent[], battery: boolean): number =>
  contents
    .filter((content) => (content.form === 'battery') === battery)
    .reduce((sum, content) => sum + (isKnown(content.count) ? content.count : 0), 0);

/** Few cells or few batteries; a parcel with both kinds is not what the exemption describes, so it is marked. */
function isFew(contents: readonly LithiumContent[], edition: LithiumEdition): boolean {
  const cells = totalOf(contents, false);
  const batteries = totalOf(contents, true);
  if (cells > 0 && batteries > 0) return false;
  return cells <= edition.markExemption.cells && batteries <= edition.markExemption.batteries;
}

/**
 * Whether the parcel bears the lithium battery mark.
 *
 * Button cells installed in equipment go without; so do at most four cells or two batteries installed in equipment
 * where the consignment has at most two such parcels.
 *
 * @param parcel how many parcels the consignment has
 * @param contents what lies in this one
 * @param rules the lines of the table that apply
 * @param edition the edition in force
 * @returns the mark, or the name of the fact that is missing where it decides
 * @source UN Model Regulations, special provision 188 (f); packing instructions 967 and 970, Section II
 */
export function decideMark(
  parcel: LithiumParcel,
  contents: readonly LithiumContent[],
  rules: readonly LithiumRule[],
  edition: LithiumEdition,
): Mark | 'parcels_in_consignment' {
  const always = rules.filter((rule) => rule.mark === 'always');
  const perhaps = rules.filter((rule) => rule.mark === 'unless_few_contained');
  const unNumbers = [...new Set([...always, ...perhaps].map((rule) => rule.unNumber))];
  const [first] = always;
  if (first !== undefined) return { required: true, unNumbers, rule: first.rule };
  if (perhaps.length === 0) return { required: false, unNumbers: [], rule: 'the class 9 label takes its place' };
  const { rule, parcels } = edition.markExemption;
  if (contents.every((content) => content.form === 'button_cell')) return { required: false, unNumbers: [], rule };
  if (!isFew(contents, edition)) return { required: true, unNumbers, rule };
  const known = parcel.parcelsInConsignment;
  if (!isKnown(known) || !Number.isSafeInteger(known)) return 'parcels_in_consignment';
  return known <= parcels ? { required: false, unNumbers: [], rule } : { required: true, unNumbers, rule };
}
