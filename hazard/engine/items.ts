import { citation } from '../citations';
import type { CitationId } from '../citations';
import type { RequiredItem } from '../types';
import { selectGloveClass } from '../gloves';
import type { Facts } from './facts';
import { hasBattery } from './sources';

/** Every item that may be required, in the order in which they are listed. */
export const REQUIRED_ITEM_IDS = [
  'rubber-insulating-gloves',
  'leather-protectors',
  'insulated-tools',
  'insulated-probes',
  'safety-glasses',
  'nonconductive-hard-hat',
  'nonmelting-clothing',
  'arc-rated-shirt-and-trousers',
  'hearing-protection',
  'leather-footwear',
  'arc-rated-face-shield-or-hood',
  'arc-rated-balaclava-or-hood',
  'arc-flash-suit-hood',
  'arc-rated-gloves',
  'contact-tester',
  'known-source',
  'clamp-ammeter',
  'lock-and-tag',
  'written-lockout-procedure',
  'insulating-covers',
  'nonconductive-ladder',
  'barricade-and-signs',
  'work-light',
] as const;
export type RequiredItemId = (typeof REQUIRED_ITEM_IDS)[number];

type Params = RequiredItem['params'];
type Wanted = [id: RequiredItemId, params: Params, basis: CitationId];

function againstShock({ path, people, voltage, edition, isSomeoneInside }: Facts): Wanted[] {
  const wanted: Wanted[] = [];
  const { gloveVolts } = voltage;
  if (people.someoneEnters) {
    const top = edition.gloves.maxUseVolts['4'];
    const params: Params =
      gloveVolts === undefined || gloveVolts > top
        ? {}
        : { class: selectGloveClass(gloveVolts, edition).gloveClass, volts: gloveVolts };
    wanted.push(
      ['rubber-insulating-gloves', params, 'osha1910.137.tableI-4'],
      ['leather-protectors', {}, 'osha1910.137(c)(2)(vii)'],
      [path === 'off' ? 'insulated-probes' : 'insulated-tools', {}, 'osha1910.335(a)(2)'],
    );
  }
  if (isSomeoneInside) {
    wanted.push(
      ['safety-glasses', {}, 'osha1910.335(a)(1)'],
      ['nonconductive-hard-hat', {}, 'osha1910.335(a)(1)'],
    );
  }
  return wanted;
}

/** By category, or by the band of 70E Table 130.5(G) that a rating falls in. */
function againstArcFlash({ arc, edition }: Facts): Wanted[] {
  const { requiredArcRatingCalPerCm2: rating, ppeCategory } = arc.result;
  if (rating === null) return [];
  const isUpper =
    ppeCategory === null
      ? rating > edition.incidentEnergyBands.lowerBandUpToCalPerCm2
      : ppeCategory >= 3;
  const basis: CitationId =
    ppeCategory === null ? 'nfpa70e.incidentEnergyBands' : 'nfpa70e.minimumArcRating';
  const params = { rating };
  const wanted: Wanted[] = [
    ['arc-rated-shirt-and-trousers', params, basis],
    ['hearing-protection', {}, basis],
    ['leather-footwear', {}, basis],
  ];
  if (isUpper) {
    wanted.push(['arc-flash-suit-hood', params, basis], ['arc-rated-gloves', params, basis]);
    return wanted;
  }
  wanted.push(['arc-rated-face-shield-or-hood', params, basis]);
  if (ppeCategory !== 1) wanted.push(['arc-rated-balaclava-or-hood', params, basis]);
  return wanted;
}

/** The instrument of the absence test, and a known source to prove it on before and after. */
function forTheTest(facts: Facts): Wanted[] {
  const { answers, path, task, sources, voltage } = facts;
  const wanted: Wanted[] = [];
  if (path === 'off' || (path === 'testing' && answers.job.task === 'test or troubleshoot')) {
    const needsDirect = task.needsDirectCurrent || sources.some(hasBattery);
    const params: Params = {
      category: answers.supply.atService === true ? 'IV' : 'III',
      volts: voltage.atLeastVolts,
      current: needsDirect ? 'ac and dc' : 'ac',
    };
    wanted.push(
      ['contact-tester', params, 'osha1910.334(c)(3)'],
      ['known-source', {}, 'nfpa70e.absenceTest'],
    );
  }
  if (facts.asksNeutralCurrent) wanted.push(['clamp-ammeter', {}, 'practice.neutral']);
  if (path === 'off') {
    wanted.push(
      ['lock-and-tag', {}, 'osha1910.333(b)(2)(iii)'],
      ['written-lockout-procedure', {}, 'osha1910.333(b)(2)(i)'],
    );
  }
  return wanted;
}

function aroundTheWork({ answers, path }: Facts): Wanted[] {
  const { groundedSurfaces, access, peopleMayApproach } = answers.surroundings;
  const wanted: Wanted[] = [];
  if (groundedSurfaces.values.some(({ covered }) => covered === true)) {
    wanted.push(['insulating-covers', {}, 'osha1910.335(a)(2)(ii)']);
  }
  if (access === 'stepladder' || access === 'extension ladder') {
    wanted.push(['nonconductive-ladder', {}, 'osha1910.333(c)(7)']);
  }
  if (peopleMayApproach !== false) {
    wanted.push(['barricade-and-signs', {}, 'osha1910.335(b)(2)']);
  }
  if (path === 'off') wanted.push(['work-light', {}, 'osha1910.333(c)(4)']);
  return wanted;
}

/** All that must be at hand before the work begins, in the order of `REQUIRED_ITEM_IDS`. */
export function requiredItemsOf(facts: Facts): RequiredItem[] {
  const wanted: Wanted[] = [
    ...againstShock(facts),
    ['nonmelting-clothing', {}, 'nfpa70e.nonmeltingClothing'],
    ...againstArcFlash(facts),
    ...forTheTest(facts),
    ...aroundTheWork(facts),
  ];
  return wanted.map(([id, params, basis]) => ({
    id,
    params,
    citation: citation(basis, facts.edition),
  }));
}
