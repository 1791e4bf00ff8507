import { ALL, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Hit, Rule } from '../engine/rule';

/**
 * `arc.study-needed`: where an arc flash is likely the label of the equipment
 * or a row of the table must hold. Outside of both only a study has a figure.
 */
export const arcFlashIsWithinTable: Rule = {
  code: 'arc.study-needed',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  appliesBelowFiftyVolts: false,
  citations: ['nfpa70e.arcFlashAssessment', 'nfpa70e.labelReview'],
  find({ arc }): Hit[] {
    return [
      ...arc.result.findings
        .filter(({ code }) => code === 'arc.study-needed')
        .map((found) => {
          const { field } = found.params;
          // The label and the table name their fields; a worksheet has a section around them.
          if (field === undefined) return found;
          return { ...found, params: { ...found.params, field: `arcFlash.${field}` } };
        }),
      ...arc.transformerGaps.map((name) =>
        notAnswered(`/arcFlash/transformer/${name}`, { limit: 'not-answered' }),
      ),
    ];
  },
};
