import type { LithiumMissingCode, LithiumReasonCode } from './lithium-content-check.js';
import type { LithiumAnswer, PackingCondition, PaperStatement, ParcelLabel } from './lithium-rules.js';

/** One sentence per code, for screens, packing slips and mails alike. */
export const answerSentences: Record<LithiumAnswer, string> = {
  no_lithium: 'Nothing with lithium is in this parcel.',
  lighter_rules: 'Small lithium cells or batteries: lighter rules apply if every condition below is met.',
  full_rules: 'Dangerous goods of class 9: the full rules apply. A trained person prepares the parcel and its papers.',
  forbidden: 'This parcel must not leave as it stands.',
  ask: 'Not certain enough to ship. Ask your carrier, or fill in what is missing.',
};

export const reasonSentences: Record<LithiumReasonCode, string> = {
  no_edition_on_record: 'No edition of the rules is on record for this way of transport and day.',
  letter_post: 'Postal operators set their own limits for lithium; their answer is needed.',
  damaged: 'Damaged cells or batteries travel only under special rules.',
  recalled: 'Cells or batteries recalled for safety travel only under special rules.',
  faulty: 'A faulty battery may be unsafe; until it is examined the carrier has to be asked.',
  for_disposal: 'Cells or batteries for disposal or recycling have rules of their own.',
  loose_cells_in_kit: 'Loose cells that the buyer joins are no tested battery; the carrier has to be asked.',
  design_not_tested: 'This design has not passed its own UN 38.3 tests; tested cells do not make a tested pack.',
  watt_hours_not_on_case: 'The watt-hours have to stand on the outside of the battery.',
  mixed_placements:
    'Batteries by themselves and batteries with equipment do not go into one parcel under these tables.',
  mixed_chemistries: 'Lithium ion and lithium metal in one parcel are not covered by these tables.',
  within_small_limits: 'Within the limits for small cells and batteries.',
  above_small_limits:
    'Above the limits for small cells and batteries, or without lighter rules for this way of transport.',
  not_on_passenger_aircraft: 'Batteries by themselves are forbidden on passenger aircraft.',
  over_net_mass: 'More cells or batteries by mass than one parcel may hold; split it.',
  over_gross_mass: 'Heavier than a parcel under the lighter rules may be; split it.',
  more_than_needed_sets: 'More batteries than the equipment needs plus two spare sets.',
  charge_above_limit: 'Charged above the limit; allowed only with the approval of the States, or after discharging.',
};

export const missingSentences: Record<LithiumMissingCode, string> = {
  contents: 'Say what with lithium is in the parcel, or that nothing is.',
  mode: 'Say how the parcel travels.',
  day: 'Say on which day it leaves.',
  parcels_in_consignment: 'Say how many parcels with lithium the consignment has.',
  gross_mass: 'Weigh the whole parcel.',
  chemistry: 'Say whether it is lithium ion or lithium metal.',
  form: 'Say whether it is a cell, a button cell or a battery of joined cells.',
  placement: 'Say whether it is in the tool, packed beside it, or by itself.',
  condition: 'Say whether it is sound.',
  design_test: 'Say whether this design has passed the UN 38.3 tests.',
  count: 'Say how many are in the parcel.',
  watt_hours: 'Give the watt-hours of one.',
  lithium_grams: 'Give the grams of lithium in one.',
  watt_hours_on_case: 'Say whether the watt-hours stand on the outside of the battery.',
  charge: 'Give the charge in percent of the rated capacity.',
  needed_by_equipment: 'Say how many the equipment in the parcel needs to run.',
  net_mass: 'Give the net mass of the cells or batteries in the parcel.',
};

export const conditionSentences: Record<PackingCondition, string> = {
  protect_from_short_circuit: 'Every terminal is protected from short circuit.',
  enclose_in_inner_packaging: 'Each cell or battery is fully enclosed in an inner packaging.',
  prevent_accidental_start: 'The tool cannot switch itself on.',
  secure_in_outer_packaging: 'A strong outer packaging holds the contents so that nothing moves.',
  withstand_drop: 'The parcel withstands a drop of 1.2 m in any position without damage, shifting or release.',
  withstand_stack: 'The parcel withstands the load of equal parcels stacked 3 m high for 24 hours.',
  quality_programme: 'Cells and batteries were made under a quality management programme.',
  offer_test_summary: 'The UN 38.3 test summary can be given to whoever asks.',
  approved_packaging: 'The packaging is approved for packing group II.',
  trained_person: 'A person trained for dangerous goods prepares and signs.',
  keep_charge_low: 'The charge is at most 30 percent of the rated capacity.',
  tell_the_sender: 'The sender has these conditions in writing before packing.',
};

export const labelSentences: Record<ParcelLabel, string> = {
  class_9_lithium: 'Class 9 label for lithium batteries (9A)',
  cargo_aircraft_only: 'Cargo aircraft only',
};

export const paperNames: Record<PaperStatement['paper'], string> = {
  transport_document: 'transport document',
  dangerous_goods_note: 'dangerous goods note',
  air_waybill: 'air waybill',
  shippers_declaration: 'shipper’s declaration',
};
