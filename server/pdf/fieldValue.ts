import {
  amperes,
  calories,
  dateText,
  feetAndInches,
  kiloamperes,
  list,
  metres,
  number,
  quantity,
  seconds,
  volts,
  watts,
} from '@/shared/format';
import { enumWord, type EnumGroup } from '@/shared/messages';
import type { PdfContext } from './context';

/** Fields whose answers are from a closed list. */
const GROUPS: Readonly<Record<string, EnumGroup>> = {
  'job.task': 'task',
  'job.special': 'special',
  'job.lamps': 'lamps',
  'supply.system': 'system',
  'supply.exposure': 'exposure',
  'supply.conductorColors': 'conductorColor',
  'supply.neutralShared': 'neutralShared',
  'supply.switching': 'switching',
  'supply.tripped': 'tripped',
  egressSupply: 'egressSupply',
  egressReaches: 'egressReaches',
  'sources.kind': 'sourceKind',
  'sources.system': 'system',
  'sources.openedAt': 'openedAt',
  'sources.held': 'held',
  'sources.extraMeasure': 'extraMeasure',
  'decision.mode': 'mode',
  'decision.reason': 'reason',
  'decision.hazard': 'hazard',
  'decision.infeasibleBecause': 'infeasibleBecause',
  'decision.temporaryLight': 'temporaryLight',
  'absenceTest.instrument': 'instrument',
  'absenceTest.category': 'category',
  'arcFlash.task': 'arcFlashTask',
  'arcFlash.equipment': 'arcFlashEquipment',
  'protectiveEquipment.gloves.gloveClass': 'gloveClass',
  'crew.gloves.gloveClass': 'gloveClass',
  'surroundings.groundedSurfaces.kind': 'surfaceKind',
  'surroundings.access': 'access',
  'surroundings.ladder.material': 'ladderMaterial',
  'surroundings.ceiling': 'ceiling',
  'surroundings.overheadLines': 'overheadLines',
  'crew.closest': 'closest',
  'proof.otherLiveParts': 'otherLiveParts',
  'proof.storedEnergy': 'storedEnergy',
};

const METRES_PER_INCH = 0.0254;

/** What somebody measured, never longer than it is: `1 ft 6 in (0.457 m)`. */
export function measured(inches: number): string {
  const imperial = feetAndInches(inches, 'down');
  return `${imperial} (${metres(inches * METRES_PER_INCH, 'down')})`;
}

/** A boundary that a label prints, never shorter than it is. */
function boundary(inches: number): string {
  return `${feetAndInches(inches)} (${metres(inches * METRES_PER_INCH)})`;
}

type Write = (value: number, context: PdfContext) => string;

const FIGURES: Readonly<Record<string, Write>> = {
  'supply.circuitVolts': (value, { locale }) => volts(locale, value),
  'supply.workVolts': (value, { locale }) => volts(locale, value),
  'supply.readings.phaseToPhase': (value, { locale }) => volts(locale, value),
  'supply.readings.phaseToNeutral': (value, { locale }) => volts(locale, value),
  'supply.watts': (value, { locale }) => watts(locale, value),
  'absenceTest.ratedVolts': (value, { locale }) => volts(locale, value),
  'arcFlash.workingDistanceInches': (value) => measured(value),
  'arcFlash.label.systemVolts': (value, { locale }) => volts(locale, value),
  'arcFlash.label.incidentEnergyCalPerCm2': (value, { locale }) => calories(locale, value),
  'arcFlash.label.workingDistanceInches': (value) => measured(value),
  'arcFlash.label.minimumArcRatingCalPerCm2': (value, { locale }) => calories(locale, value),
  'arcFlash.label.arcFlashBoundaryInches': (value) => boundary(value),
  'arcFlash.availableFaultKiloamperes': (value, { locale }) => kiloamperes(locale, value),
  'arcFlash.clearingSeconds': (value, { locale }) => seconds(locale, value),
  'arcFlash.transformer.kilovoltAmperes': (value, { locale }) => quantity(locale, value, 'kVA'),
  'arcFlash.transformer.secondaryVolts': (value, { locale }) => volts(locale, value),
  'arcFlash.transformer.impedancePercent': (value, { locale }) => quantity(locale, value, '%'),
  'arcFlash.clothingRatingCalPerCm2': (value, { locale }) => calories(locale, value),
  'surroundings.ladder.sizeFeet': (value) => measured(value * 12),
  'surroundings.ladder.standingLevelFeet': (value) => measured(value * 12),
  'surroundings.ceilingHeightFeet': (value) => measured(value * 12),
  'surroundings.barricadeInches': (value) => measured(value),
  'proof.neutralAmperes': (value, { locale }) => amperes(locale, value),
  'closeOut.egressTestedSeconds': (value, { locale }) => seconds(locale, value),
};

const DATE = /(?:On|Through)$/;
const DATE_TIME = /(?:At|Until)$/;

function written(path: string, value: unknown, context: PdfContext): string {
  const { m, locale } = context;
  if (typeof value === 'boolean') return value ? m.common.yes : m.common.no;
  if (typeof value === 'number') {
    return FIGURES[path]?.(value, context) ?? number(locale, value);
  }
  if (typeof value !== 'string') return JSON.stringify(value);
  const group = GROUPS[path];
  if (group) return enumWord(locale, group, value);
  switch (path) {
    case 'job.siteId':
      return context.site?.name ?? context.worksheet.siteName ?? value;
    case 'sources.byCrewId':
    case 'sources.lockedBy':
    case 'absenceTest.byCrewId':
      return context.crewName(value);
    case 'sources.sameConductorsAs':
    case 'proof.openedSources':
      return context.wayNumber(value);
    case 'protectiveEquipment.ready':
      return value;
    case 'briefing.topics':
      return value;
  }
  if (path.endsWith('aedAt')) return value;
  if (DATE.test(path)) return dateText(locale, value);
  if (DATE_TIME.test(path)) return context.at(value);
  return value;
}

/** An answer in words, in the reader's language and the site's time; null where there is none. */
export function fieldValue(path: string, value: unknown, context: PdfContext): string | null {
  if (value === undefined || value === null || value === '') return null;
  if (!Array.isArray(value)) return written(path, value, context);
  if (value.length === 0) return context.m.common.none;
  return list(
    context.locale,
    value.map((each) => written(path, each, context)),
  );
}
