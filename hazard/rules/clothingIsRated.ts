import { ALL, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/** `arc.rating-low`: the lowest rating worn inside the arc flash boundary is what protects. */
export const clothingIsRated: Rule = {
  code: 'arc.rating-low',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  appliesBelowFiftyVolts: false,
  citations: ['nfpa70e.incidentEnergyBands', 'nfpa70e.minimumArcRating'],
  find({ answers, arc }) {
    const required = arc.result.requiredArcRatingCalPerCm2;
    const rating = answers.arcFlash.clothingRatingCalPerCm2;
    if (required === null) return [];
    const path = '/arcFlash/clothingRatingCalPerCm2';
    if (rating === undefined) return [notAnswered(path, { required })];
    return rating < required ? [{ path, params: { rating, required } }] : [];
  },
};
