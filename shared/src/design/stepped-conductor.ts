import { ArithmeticError } from '../errors/arithmetic-error.js';
import { type DesignFigure, type DesignMethod, requirePositive, warn } from './design-figure.js';
import { type RoundWire, alternatingResistance, directResistance } from './round-wire-resistance.js';

export interface SectionFigures {
  readonly direct: DesignFigure;
  /** At the drive's frequency; undefined where none was given. */
  readonly alternating: DesignFigure | undefined;
  /** Voltage drop over the section (V). */
  readonly drop: DesignFigure;
  /** Heat in the section (W). */
  readonly power: DesignFigure;
  /** Its share of the whole heat, 0 to 1. */
  readonly share: DesignFigure;
}

export interface SteppedConductorSheet {
  readonly sections: readonly SectionFigures[];
  readonly resistance: DesignFigure;
  readonly drop: DesignFigure;
  readonly power: DesignFigure;
}

const dropMethod: DesignMethod = {
  name: 'Drop along a conductor',
  formula: 'U = I R',
  source: 'Ohm’s law; R at the drive’s frequency where one is given',
  validRange: 'resistive part only: the loop’s inductance is left out',
};
const powerMethod: DesignMethod = {
  name: 'Heat along a conductor',
  formula: 'P = I² R',
  source: 'Joule’s law, effective current; R at the drive’s frequency where one is given',
  validRange: 'sections at the temperatures given, joints left out',
};
const shareMethod: DesignMethod = {
  name: 'Share of the heat',
  formula: 'P_section / P',
  source: 'definition',
  validRange: 'as the heat',
};

function sectionFigures(section: RoundWire, amperes: number, hertz: number | undefined): Omit<SectionFigures, 'share'> {
  const direct = directResistance(section);
  const alternating = hertz === undefined ? undefined : alternatingResistance(section, hertz);
  const used = alternating ?? direct;
  const short = section.lengthMillimetres < 3 * section.diameterMillimetres ? [warn('section_short')] : [];
  const warnings = [...used.warnings, ...short];
  return {
    direct,
    alternating,
    drop: { value: amperes * used.value, unit: 'V', method: dropMethod, warnings },
    power: { value: amperes * amperes * used.value, unit: 'W', method: powerMethod, warnings },
  };
}

const uniqueWarnings = (figures: readonly DesignFigure[]): DesignFigure['warnings'] => {
  const all = figures.flatMap((figure) => figure.warnings);
  return all.filter((each, index) => all.findIndex((other) => other.sentence === each.sentence) === index);
};

/**
 * Resistance, drop and heat along a tip of several round sections, one after the other.
 *
 * @param sections in order: material, length (mm), diameter (mm), temperature (°C) of each
 * @param amperes effective current (A)
 * @param hertz frequency of the drive (Hz); left out, direct current
 * @returns figures of each section and of the whole; drops and heats add up
 * @throws ArithmeticError `design_no_sections`, `design_not_positive`, `measure_not_a_number`
 * @source Ohm's and Joule's laws; alternating current by the approximation of {@link alternatingResistance}
 */
export function steppedConductor(
  sections: readonly RoundWire[],
  amperes: number,
  hertz?: number,
): SteppedConductorSheet {
  if (sections.length === 0) throw new ArithmeticError('design_no_sections');
  requirePositive('current', amperes);
  const figures = sections.map((section) => sectionFigures(section, amperes, hertz));
  const sum = (of: (figure: Omit<SectionFigures, 'share'>) => number): number =>
    figures.reduce((total, figure) => total + of(figure), 0);
  const power = sum((figure) => figure.power.value);
  const warnings = uniqueWarnings(figures.map((figure) => figure.power));
  const { method } = figures[0]?.alternating ?? figures[0]?.direct ?? { method: powerMethod };
  return {
    sections: figures.map((figure) => ({
      ...figure,
      share: {
        value: figure.power.value / power,
        unit: 'ratio',
        method: shareMethod,
        warnings: figure.power.warnings,
      },
    })),
    resistance: { value: sum((figure) => (figure.alternating ?? figure.direct).value), unit: 'Ω', method, warnings },
    drop: { value: sum((figure) => figure.drop.value), unit: 'V', method: dropMethod, warnings },
    power: { value: power, unit: 'W', method: powerMethod, warnings },
  };
}
