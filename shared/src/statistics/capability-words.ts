import type { Capability } from './capability.js';
import { normalShareBelow } from './normal-distribution.js';

/** The least index that a shop usually asks for. Common practice, no source. */
export const usualCapability = 1.33;

/**
 * Share outside the limits if the values are normal and the process stays as it is.
 *
 * @param capability the indices
 * @returns a share from 0 to 1
 * @source normal distribution; NIST/SEMATECH e-Handbook 6.1.6
 */
export function expectedOutside({ toLower, toUpper }: Pick<Capability, 'toLower' | 'toUpper'>): number {
  const beyond = (index: number | undefined): number => (index === undefined ? 0 : normalShareBelow(-3 * index));
  return beyond(toLower) + beyond(toUpper);
}

const perThousand = (share: number): string => {
  const parts = share * 1000;
  if (parts < 0.01) return 'fewer than one in 100,000';
  return parts < 1
    ? `about ${Math.max(1, Math.round(share * 100_000))} in 100,000`
    : `about ${Math.round(parts)} in 1,000`;
};

/**
 * What a capability means, in a plain sentence or two.
 *
 * @param capability the indices with their interval
 * @param count how many values they rest on
 * @returns sentences for a screen; they judge by the whole interval, not by the estimate alone
 */
export function capabilitySentence(capability: Capability, count: number): string {
  const { nearer } = capability;
  const percent = Math.round(capability.confidence * 100);
  const range = `${nearer.value.toFixed(2)} (${nearer.low.toFixed(2)} to ${nearer.high.toFixed(2)} at ${percent} percent confidence, from ${count} values)`;
  const outside = `If nothing changes, ${perThousand(expectedOutside(capability))} would lie outside the limits.`;
  if (nearer.value < 0) return `The average itself lies outside the limits: ${range}.`;
  if (nearer.low >= usualCapability) return `Clearly capable: ${range}. ${outside}`;
  if (nearer.high < 1) return `Not capable: ${range}. ${outside}`;
  if (nearer.value >= usualCapability) return `Looks capable, but these values do not prove it: ${range}. ${outside}`;
  return `Too close to the limits to be called capable: ${range}. ${outside}`;
}
