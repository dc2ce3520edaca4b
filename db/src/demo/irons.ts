import type { DemoCharacteristic, DemoMadePart } from './scenario.types.js';
import { cells, fumes, hotTip, step } from './steps.js';

interface IronPlan {
  readonly insulation: readonly [string];
  readonly tip: readonly [string, string, string];
  readonly frequency: readonly [string, string, string];
  readonly current: readonly [string, string, string];
  readonly warmUp: readonly [string];
  readonly settled: readonly [string, string, string];
}

const limits = (
  name: string,
  unit: string,
  digits: number,
  [lower, target, upper]: readonly [string, string, string],
) => ({
  name,
  unit,
  digits,
  lower,
  target,
  upper,
});

function ironPlan(plan: IronPlan): readonly DemoCharacteristic[] {
  return [
    { name: 'Shell closes without a gap', condition: 'by eye, all round' },
    { name: 'Insulation, tabs to sink', unit: 'MΩ', digits: 0, lower: plan.insulation[0], condition: 'at 100 V, 5 s' },
    { ...limits('Tip, cold', 'mΩ', 2, plan.tip), condition: 'four wires, at 25 °C' },
    { ...limits('Drive frequency', 'kHz', 1, plan.frequency), condition: 'full pack, no load' },
    {
      ...limits('Pack current at working drive', 'A', 2, plan.current),
      condition: 'at 25 °C, drive at 30 %, tip fitted',
      caution: hotTip,
    },
    { name: 'Time to 350 °C', unit: 's', digits: 1, upper: plan.warmUp[0], condition: 'from 25 °C', caution: hotTip },
    { ...limits('Settled temperature', '°C', 0, plan.settled), condition: 'after 30 s', caution: hotTip },
    { name: 'Button released: heating stops', condition: 'three times' },
  ];
}

/** The two irons: one by one, with serial numbers. */
export const irons: readonly DemoMadePart[] = [
  {
    code: 'WREN-60',
    name: 'Wren 60',
    traced: 'single',
    serialLetters: 'WR',
    weight: '392',
    bin: 'G2',
    lines: [
      { part: 'DRIVE-W', quantity: '1', marks: '5 6' },
      { part: 'TRANSFORMER-W', quantity: '1', marks: '4' },
      { part: 'TURN-W', quantity: '1', marks: '3' },
      { part: 'CLAMP-N2', quantity: '1', marks: '2' },
      { part: 'TIP-W-STEPPED', quantity: '1', marks: '1' },
      { part: 'PACK-W', quantity: '1', marks: '7' },
      { part: 'CONN-30-JACK', quantity: '1' },
      { part: 'SOCKET-C', quantity: '1' },
      { part: 'BUTTON-HEAT', quantity: '1' },
      { part: 'SWITCH-MAIN', quantity: '1' },
      { part: 'SHELL-W-LEFT', quantity: '1', marks: '9' },
      { part: 'SHELL-W-RIGHT', quantity: '1', marks: '9' },
      { part: 'CAP-END-W', quantity: '1', marks: '8' },
      { part: 'NOSE-W', quantity: '1' },
      { part: 'KNOB-POWER', quantity: '1' },
      { part: 'WIRE-SIL-RED', quantity: '0.12' },
      { part: 'WIRE-SIL-BLACK', quantity: '0.12' },
      { part: 'SLEEVE-6', quantity: '0.08' },
      { part: 'SCREW-M2-6', quantity: '6', scrap: '2' },
      { part: 'SCREW-M3-6', quantity: '4', scrap: '2' },
      { part: 'INSERT-M2', quantity: '6', scrap: '2' },
      { part: 'LABEL-UNIT', quantity: '1', scrap: '3' },
      { part: 'LABEL-HOT', quantity: '1', scrap: '3' },
    ],
    steps: [
      step('Join board, transformer and secondary turn', '12', 'The turn sits flat; solder both tabs through.', fumes),
      step('Fit clamps and tip', '5', 'Faces bright, 0.8 Nm.'),
      step('Connect the pack', '4', 'Main switch off. Plug last.', cells),
      step('Close the shell', '7', 'No wire under the ribs. Cross-wise, by hand.'),
    ],
    plan: ironPlan({
      insulation: ['10'],
      tip: ['0.95', '1.05', '1.15'],
      frequency: ['49.0', '52.0', '55.0'],
      current: ['1.60', '1.85', '2.10'],
      warmUp: ['4.5'],
      settled: ['335', '350', '365'],
    }),
  },
  {
    code: 'HERON-140',
    name: 'Heron 140',
    traced: 'single',
    serialLetters: 'HR',
    weight: '655',
    bin: 'G2',
    lines: [
      { part: 'DRIVE-H', quantity: '1', marks: '5 6' },
      { part: 'TRANSFORMER-H', quantity: '1', marks: '4' },
      { part: 'TURN-H', quantity: '1', marks: '3' },
      { part: 'BUSBAR-H', quantity: '1', marks: '3' },
      { part: 'CLAMP-N3', quantity: '1', marks: '2' },
      { part: 'TIP-H-STEPPED', quantity: '1', marks: '1' },
      { part: 'PACK-H', quantity: '1', marks: '7' },
      { part: 'CONN-30-JACK', quantity: '1' },
      { part: 'SOCKET-C', quantity: '1' },
      { part: 'BUTTON-HEAT', quantity: '1' },
      { part: 'SWITCH-MAIN', quantity: '1' },
      { part: 'SHELL-H-LEFT', quantity: '1', marks: '9' },
      { part: 'SHELL-H-RIGHT', quantity: '1', marks: '9' },
      { part: 'CAP-END-H', quantity: '1', marks: '8' },
      { part: 'NOSE-H', quantity: '1' },
      { part: 'KNOB-POWER', quantity: '1' },
      { part: 'WIRE-SIL-RED', quantity: '0.16' },
      { part: 'WIRE-SIL-BLACK', quantity: '0.16' },
      { part: 'SLEEVE-6', quantity: '0.1' },
      { part: 'SCREW-M25-8', quantity: '8', scrap: '2' },
      { part: 'SCREW-M3-6', quantity: '6', scrap: '2' },
      { part: 'INSERT-M25', quantity: '8', scrap: '2' },
      { part: 'LABEL-UNIT', quantity: '1', scrap: '3' },
      { part: 'LABEL-HOT', quantity: '1', scrap: '3' },
    ],
    steps: [
      step(
        'Join board, transformer and secondary turn',
        '15',
        'Bus bars first, then the turn; solder all tabs through.',
        fumes,
      ),
      step('Fit clamps and tip', '6', 'Faces bright, 1.0 Nm.'),
      step('Connect the pack', '5', 'Main switch off. Plug last.', cells),
      step('Close the shell', '8', 'No wire under the ribs. Cross-wise, by hand.'),
    ],
    plan: ironPlan({
      insulation: ['10'],
      tip: ['0.55', '0.62', '0.69'],
      frequency: ['44.0', '47.5', '51.0'],
      current: ['1.90', '2.25', '2.60'],
      warmUp: ['5.5'],
      settled: ['350', '365', '380'],
    }),
  },
];
