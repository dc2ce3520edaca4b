import { billFaults } from './faults/bill.js';
import { captureFaults } from './faults/capture.js';
import { cellsFaults } from './faults/cells.js';
import { costingFaults } from './faults/costing.js';
import { designFaults } from './faults/design.js';
import { judgeFaults } from './faults/judge.js';
import { kitFaults } from './faults/kit.js';
import { measureFaults } from './faults/measure.js';
import { moneyFaults } from './faults/money.js';
import { planFaults } from './faults/plan.js';
import { serialFaults } from './faults/serial.js';
import { statisticsFaults } from './faults/statistics.js';
import { transportFaults } from './faults/transport.js';

/**
 * Every fault of the trade's arithmetic: code → sentence with `{details}`. Each subject keeps its own table; codes start
 * with the subject's name.
 */
export const arithmeticFaults = {
  ...moneyFaults,
  ...measureFaults,
  ...billFaults,
  ...planFaults,
  ...costingFaults,
  ...serialFaults,
  ...judgeFaults,
  ...captureFaults,
  ...statisticsFaults,
  ...cellsFaults,
  ...designFaults,
  ...transportFaults,
  ...kitFaults,
} as const;

export type ArithmeticFault = keyof typeof arithmeticFaults;
