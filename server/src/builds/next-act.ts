import type { BatchItemRow, StripRow } from './batch-lists.repository.js';
import type { NextActDto } from './batch.dto.js';

const count = (number: number, one: string, many: string) => `${number} ${number === 1 ? one : many}`;

/** What to do next about a batch, in a sentence. */
export function nextAct(batch: BatchItemRow, units: readonly StripRow[]): NextActDto {
  if (batch.status === 'planned' || batch.status === 'picking') return pickingAct(batch);
  if (batch.status === 'in_build') return buildingAct(batch, units);
  if (batch.status === 'done') return { act: 'none', sentence: 'Everything of it is on the shelf or scrapped.' };
  return { act: 'none', sentence: 'It was withdrawn; nothing of it is claimed any more.' };
}

function pickingAct(batch: BatchItemRow): NextActDto {
  if (batch.linesToPick === 0) return { act: 'start_building', sentence: 'Everything is picked. Start building.' };
  if (batch.linesShort === batch.linesToPick) {
    return {
      act: 'claim',
      sentence: `${count(batch.linesShort, 'line waits', 'lines wait')} for parts. Nothing can be picked yet.`,
    };
  }
  const short =
    batch.linesShort === 0 ? '' : ` ${count(batch.linesShort, 'line is', 'lines are')} short of parts on the shelf.`;
  const verb = batch.status === 'planned' ? 'Pick' : 'Go on picking:';
  return { act: 'pick', sentence: `${verb} ${count(batch.linesToPick, 'line', 'lines')}.${short}` };
}

function buildingAct(batch: BatchItemRow, units: readonly StripRow[]): NextActDto {
  if (batch.traced !== 'single') {
    const left = batch.quantity - batch.madeQuantity;
    return {
      act: 'build',
      sentence: `${count(left, 'piece is', 'pieces are')} still to be made and put on the shelf.`,
    };
  }
  const under = units.filter(({ finished, verdict }) => !finished && verdict !== 'scrapped');
  const failed = under.filter(({ verdict }) => verdict === 'failed').length;
  if (failed > 0)
    return { act: 'build', sentence: `${count(failed, 'unit has', 'units have')} failed and wait for rework.` };
  const sound = under.filter(({ verdict }) => verdict === 'passed').length;
  if (sound > 0) {
    return { act: 'build', sentence: `${count(sound, 'unit has', 'units have')} passed and can be put on the shelf.` };
  }
  const steps = under.filter(({ stepsDone, stepsTotal }) => stepsDone < stepsTotal).length;
  if (steps > 0) return { act: 'build', sentence: `${count(steps, 'unit is', 'units are')} still to be built.` };
  return { act: 'build', sentence: `${count(under.length, 'unit is', 'units are')} built and wait for measuring.` };
}
