import { textWidth } from './textWidth';
import type { Frame, SectionInput } from './sectionTypes';
import { farthestFeet } from './zones';

/** Smaller scales than the asked one: in print 1/4, 3/16, 1/8, 3/32, 1/16 in to the foot and so on. */
const SMALLER_SCALES = [24, 18, 12, 9, 6, 4.5, 3, 2.25, 1.5, 1];
/** From the floor to the slab above nothing higher than this is drawn. */
const GREATEST_HEIGHT = 430;
const SLAB = 6;
/** Room between a suspended ceiling and the slab above it, in feet. */
export const PLENUM_FEET = 2.2;
/** A tile and its grid, in feet. */
export const TILE_FEET = 0.1;
/** The exposed part lies this far above the underside of the ceiling, in feet. */
const PART_ABOVE_CEILING = 0.3;
/** A panel's parts are taken to be at chest height, in feet. */
const PANEL_PART_HEIGHT = 4.5;
/** What is drawn where the ceiling is not known yet, in feet. */
const USUAL_CEILING = 9;
/** A person outside the barricade, with room to either side, in feet. */
const PERSON_FEET = 2.1;

const ROW_NAME_TO_ORIGIN = 37;

/** Where the exposed part stands, so that the names of the rows below have room beside it. */
function originX({ zones, width, medium }: SectionInput): number {
  const size = rowNameSize(medium);
  const names = [...zones.zones, ...(zones.barricade ? [zones.barricade] : [])];
  const widest = Math.max(0, ...names.map(({ name }) => textWidth(name, size, 600)));
  return Math.max(Math.round(width * 0.31), Math.ceil(widest) + ROW_NAME_TO_ORIGIN + 2);
}

export function rowNameSize(medium: SectionInput['medium']): number {
  return medium === 'screen' ? 14 : 13;
}

function fits(input: SectionInput, scale: number, x: number): boolean {
  const someoneOutside = input.people.some(
    ({ closest }) => closest === 'outside all boundaries' || closest === 'outside limited',
  );
  const beyond = someoneOutside ? PERSON_FEET * scale + 6 : 16;
  const feetUp = (input.ceilingHeightFeet ?? USUAL_CEILING) + PLENUM_FEET + TILE_FEET;
  return (
    x + farthestFeet(input.zones) * scale + beyond <= input.width &&
    feetUp * scale <= GREATEST_HEIGHT
  );
}

/** Scale and fixed points of a drawing: the asked scale, or the next smaller one at which all fits. */
export function frameOf(input: SectionInput): Frame {
  const x = originX(input);
  const scale =
    [input.pixelsPerFoot, ...SMALLER_SCALES]
      .filter((candidate) => candidate <= input.pixelsPerFoot)
      .find((candidate) => fits(input, candidate, x)) ?? 1;
  const ceiling = SLAB + (PLENUM_FEET + TILE_FEET) * scale;
  const floor = ceiling + (input.ceilingHeightFeet ?? USUAL_CEILING) * scale;
  const isPanel = input.place === 'panel';
  const part = {
    x,
    y: isPanel
      ? Math.max(ceiling + scale, floor - PANEL_PART_HEIGHT * scale)
      : ceiling - PART_ABOVE_CEILING * scale,
  };
  return {
    width: input.width,
    scale,
    slab: SLAB,
    ceiling,
    floor,
    part,
    bounds: {
      left: isPanel ? x - 0.5 * scale : 0,
      top: isPanel ? ceiling : SLAB,
      right: input.width,
      bottom: floor,
    },
  };
}
