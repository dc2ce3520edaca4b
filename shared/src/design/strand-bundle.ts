import { copper } from '../measure/conductor-material.js';
import { addedDiameters, crossSection, equalSingleDiameter } from '../measure/wire.js';
import { type DesignFigure, type DesignMethod, requirePositive, requireWhole, warn } from './design-figure.js';
import { diameterText } from './round-wire-resistance.js';
import { skinDepth } from './skin-depth.js';

export interface StrandBundle {
  /** Copper of all strands (mm²). */
  readonly area: DesignFigure;
  /** One solid wire with as much copper (mm). */
  readonly equalWire: DesignFigure;
  /** Diameters added up (mm): what people say, not what carries the current. */
  readonly addedDiameters: DesignFigure;
  /** Skin depth that the strand is compared with (mm). */
  readonly skin: DesignFigure;
}

const areaMethod: DesignMethod = {
  name: 'Copper area of parallel strands',
  formula: 'A = n π d² / 4',
  source: 'geometry',
  validRange: 'bare diameter, all strands carrying alike',
};
const equalMethod: DesignMethod = {
  name: 'One wire of equal area',
  formula: 'd √n',
  source: 'geometry',
  validRange: areaMethod.validRange,
};
const addedMethod: DesignMethod = {
  name: 'Diameters added up',
  formula: 'n d',
  source: 'common practice, no source; not a measure of copper',
  validRange: 'only to understand what is meant',
};

/**
 * Several strands wound side by side.
 *
 * @param strands how many
 * @param strandMillimetres bare diameter of one (mm)
 * @param hertz frequency of the current (Hz)
 * @param celsius temperature of the winding (°C)
 * @returns copper area, equal single wire, added diameters and skin depth; warns of strands above two skin depths
 * @throws ArithmeticError `design_not_a_count`, `design_not_positive`, `measure_not_a_number`
 * @source geometry; a strand no thicker than two skin depths: common practice, no source
 */
export function strandBundle(strands: number, strandMillimetres: number, hertz: number, celsius = 20): StrandBundle {
  requireWhole('number of strands', strands);
  requirePositive('strand diameter', strandMillimetres);
  const skin = skinDepth(copper, hertz, celsius);
  const wire = { material: copper, diameterMillimetres: diameterText(strandMillimetres), strands };
  const warnings = [
    ...(strandMillimetres > 2 * skin.value ? [warn('strand_too_thick', { twice: (2 * skin.value).toFixed(2) })] : []),
    warn('proximity_ignored'),
  ];
  return {
    area: { value: crossSection(wire).toNumber(), unit: 'mm²', method: areaMethod, warnings },
    equalWire: { value: equalSingleDiameter(wire).toNumber(), unit: 'mm', method: equalMethod, warnings },
    addedDiameters: { value: addedDiameters(wire).toNumber(), unit: 'mm', method: addedMethod, warnings },
    skin,
  };
}
