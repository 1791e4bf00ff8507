import type { EditionCitationId } from '../types';
import type { Citation, Confidence } from '../../types';

const clause = (table: string, confidence: Confidence): Citation => ({
  standard: 'NFPA 70E',
  edition: '2024',
  table,
  confidence,
});

/** Where NFPA 70E-2024 says it. Where an earlier edition numbers it otherwise, that number stands beside it. */
export const citations: Readonly<Record<EditionCitationId, Citation>> = {
  'nfpa70e.article320': clause('Article 320', 'agreeing'),
  'nfpa70e.briefing': clause('110.3(I) (2021: 110.5(I))', 'single'),
  'nfpa70e.training': clause('110.4 (2021: 110.6)', 'single'),
  'nfpa70e.energizedWork': clause('110.2(B) (2021: 110.4)', 'agreeing'),
  'nfpa70e.normalCondition': clause('110.2(B) Exception 1', 'agreeing'),
  'nfpa70e.electricallySafeWorkCondition': clause('120.6 (2018, 2021: 120.5)', 'agreeing'),
  'nfpa70e.allSources': clause('120.6(1) (2018, 2021: 120.5(1))', 'agreeing'),
  'nfpa70e.absenceTest': clause('120.6(7) (2018, 2021: 120.5(7))', 'agreeing'),
  'nfpa70e.permit': clause('130.2 (2018: 130.2(B))', 'agreeing'),
  'nfpa70e.permitExemptions': clause('130.2(C)', 'agreeing'),
  'nfpa70e.permitExemptTesting': clause('130.2(C)(1)', 'agreeing'),
  'nfpa70e.permitExemptInspection': clause('130.2(C)(2)', 'agreeing'),
  'nfpa70e.shockApproach': clause('130.4', 'agreeing'),
  'nfpa70e.shockAc': clause('Table 130.4(E)(a) (2018: 130.4(D)(a))', 'agreeing'),
  'nfpa70e.shockAcAbove750': clause('Table 130.4(E)(a) (2018: 130.4(D)(a))', 'single'),
  'nfpa70e.shockDc': clause('Table 130.4(E)(b) (2018: 130.4(D)(b))', 'memory'),
  'nfpa70e.arcFlashAssessment': clause('130.5', 'agreeing'),
  'nfpa70e.labelReview': clause('130.5, review every 5 years', 'memory'),
  'nfpa70e.likelihood': clause('Table 130.5(C)', 'memory'),
  'nfpa70e.likelihoodOperateDevice': clause('Table 130.5(C)', 'agreeing'),
  'nfpa70e.likelihoodBreaker': clause('Table 130.5(C)', 'single'),
  'nfpa70e.incidentEnergyBands': clause('Table 130.5(G)', 'agreeing'),
  'nfpa70e.label': clause('130.5(H)', 'agreeing'),
  'nfpa70e.protectiveEquipment': clause('130.7', 'agreeing'),
  'nfpa70e.nonmeltingClothing': clause('130.7(C)', 'memory'),
  'nfpa70e.ppeCategoryRow1': clause('Table 130.7(C)(15)(a), panelboards to 240 V', 'agreeing'),
  'nfpa70e.ppeCategoryRow2': clause(
    'Table 130.7(C)(15)(a), panelboards above 240 V to 600 V',
    'single',
  ),
  'nfpa70e.ppeCategoryRow3': clause(
    'Table 130.7(C)(15)(a), motor control centers, 65 kA',
    'memory',
  ),
  'nfpa70e.ppeCategoryRow4': clause(
    'Table 130.7(C)(15)(a), motor control centers, 42 kA',
    'memory',
  ),
  'nfpa70e.ppeCategoryRow5': clause('Table 130.7(C)(15)(a), switchgear and switchboards', 'memory'),
  'nfpa70e.ppeCategoryRow6': clause('Table 130.7(C)(15)(a), other 600 V class', 'memory'),
  'nfpa70e.minimumArcRating': clause('Table 130.7(C)(15)(c)', 'agreeing'),
  'nfpa70e.barricade': clause('130.7(E)', 'memory'),
};
