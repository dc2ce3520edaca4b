-- Facts a shop starts with. Rates and borders change: the screens that use them say so, and new rows are added by date.

-- Standard rates from memory; each shop checks them against the current list of the European Commission.
insert into vat_rate (country_code, rate, valid_from, valid_until, source)
select code, rate, valid_from::date, valid_until::date, 'From memory; check the current national rate before use'
from (values
  ('AT', 20.0, '2024-01-01', null), ('BE', 21.0, '2024-01-01', null), ('BG', 20.0, '2024-01-01', null),
  ('CY', 19.0, '2024-01-01', null), ('CZ', 21.0, '2024-01-01', null), ('DE', 19.0, '2024-01-01', null),
  ('DK', 25.0, '2024-01-01', null), ('EE', 22.0, '2024-01-01', '2025-06-30'), ('EE', 24.0, '2025-07-01', null),
  ('ES', 21.0, '2024-01-01', null), ('FI', 24.0, '2024-01-01', '2024-08-31'), ('FI', 25.5, '2024-09-01', null),
  ('FR', 20.0, '2024-01-01', null), ('GR', 24.0, '2024-01-01', null), ('HR', 25.0, '2024-01-01', null),
  ('HU', 27.0, '2024-01-01', null), ('IE', 23.0, '2024-01-01', null), ('IT', 22.0, '2024-01-01', null),
  ('LT', 21.0, '2024-01-01', null), ('LU', 17.0, '2024-01-01', null), ('LV', 21.0, '2024-01-01', null),
  ('MT', 18.0, '2024-01-01', null), ('NL', 21.0, '2024-01-01', null), ('PL', 23.0, '2024-01-01', null),
  ('PT', 23.0, '2024-01-01', null), ('RO', 19.0, '2024-01-01', '2025-07-31'), ('RO', 21.0, '2025-08-01', null),
  ('SE', 25.0, '2024-01-01', null), ('SI', 22.0, '2024-01-01', null), ('SK', 20.0, '2024-01-01', '2024-12-31'),
  ('SK', 23.0, '2025-01-01', null)
) as rates (code, rate, valid_from, valid_until);

insert into vat_exception (country_code, postcode_prefix, sentence) values
  ('GB', 'BT', 'Goods to Northern Ireland follow rules of their own.'),
  ('ES', '35', 'The Canary Islands are outside the union''s VAT area.'),
  ('ES', '38', 'The Canary Islands are outside the union''s VAT area.'),
  ('ES', '51', 'Ceuta is outside the union''s VAT area.'),
  ('ES', '52', 'Melilla is outside the union''s VAT area.'),
  ('DE', '27498', 'Heligoland is outside the union''s VAT area.'),
  ('DE', '78266', 'Büsingen is outside the union''s VAT area.'),
  ('IT', '23041', 'Livigno is outside the union''s VAT area.'),
  ('FR', '97', 'The overseas departments follow rules of their own.'),
  ('FR', '98', 'The overseas territories are outside the union''s VAT area.'),
  ('FI', '22', 'Åland is outside the union''s VAT area.'),
  ('GR', '63086', 'Mount Athos is outside the union''s VAT area.'),
  ('PT', '9', 'Madeira and the Azores have rates of their own.');
