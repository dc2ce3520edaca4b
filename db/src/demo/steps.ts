import type { DemoStep } from './scenario.types.js';

export const fumes = 'Solder with the extraction on. Flux fumes irritate the airways.';
export const cells =
  'Never short a cell. Put a hot, dented or leaking cell into the quarantine bin outside and tell the owner.';
export const hotTip = 'The tip passes 300 °C within seconds of the button. Stand it in the rest before you let go.';

export const step = (title: string, minutes: string, instruction: string, caution?: string): DemoStep =>
  caution === undefined ? { title, minutes, instruction } : { title, minutes, instruction, caution };
