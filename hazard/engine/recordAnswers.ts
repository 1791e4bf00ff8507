import * as E from '../enumerations';
import { figure, flag, moment, one, text, texts } from './answer';
import { field, fields, readObjects, readSigned } from './read';
import type { Fields } from './read';

function readReading(reading: Fields) {
  return {
    point: text(reading, 'point')?.trim(),
    from: one(reading, 'from', E.CONDUCTORS),
    to: one(reading, 'to', E.CONDUCTORS),
    volts: readSigned(field(reading, 'volts')),
    /** Not answered is alternating current. */
    current: one(reading, 'current', E.CURRENTS) ?? 'ac',
    lowImpedance: flag(reading, 'lowImpedance'),
    sourceId: text(reading, 'sourceId'),
    at: moment(reading, 'at'),
  };
}

/** Reads what the lead recorded to prove the circuit dead, whatever it is. */
export function readProof(proof: unknown) {
  const root = fields(proof);
  return {
    openedSources: texts(root, 'openedSources'),
    controlsOperated: flag(root, 'controlsOperated'),
    provedBefore: flag(root, 'provedBefore'),
    provedAfter: flag(root, 'provedAfter'),
    otherLiveParts: one(root, 'otherLiveParts', E.OTHER_LIVE_PARTS),
    neutralAmperes: figure(root, 'neutralAmperes'),
    storedEnergy: one(root, 'storedEnergy', E.STORED_ENERGY),
    readings: readObjects(field(root, 'readings'), readReading),
  };
}

/** Reads how the job ended, whatever it is. */
export function readCloseOut(closeOut: unknown) {
  const root = fields(closeOut);
  return {
    toolsClear: flag(root, 'toolsClear'),
    peopleWarned: flag(root, 'peopleWarned'),
    peopleClear: flag(root, 'peopleClear'),
    restored: flag(root, 'restored'),
    coversOn: flag(root, 'coversOn'),
    locksRemoved: flag(root, 'locksRemoved'),
    faultRepaired: flag(root, 'faultRepaired'),
    egressTestedSeconds: figure(root, 'egressTestedSeconds'),
    egressLit: flag(root, 'egressLit'),
  };
}

export type ProofAnswers = ReturnType<typeof readProof>;
export type CloseOutAnswers = ReturnType<typeof readCloseOut>;
export type ReadingAnswers = ReturnType<typeof readReading>;
