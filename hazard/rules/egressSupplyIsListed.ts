import type { EgressSupply, SourceKind } from '../enumerations';
import { ALL, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

const KIND_OF: Partial<Record<EgressSupply, SourceKind>> = {
  'battery units': 'battery unit',
  generator: 'generator',
  'central inverter': 'central inverter',
};

/** `sources.egress-not-listed`: the supply of the emergency lighting is one of the sources to open. */
export const egressSupplyIsListed: Rule = {
  code: 'sources.egress-not-listed',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['practice.egressSupply', 'face04WA080'],
  find({ answers, isEmergencyLighting, sources }) {
    if (!isEmergencyLighting) return [];
    const isUnsettled =
      !answers.sources.isAnswered || sources.some(({ kind }) => kind === undefined);
    return answers.egressSupply.values.flatMap((supply) => {
      const wanted = KIND_OF[supply];
      if (wanted === undefined || sources.some(({ kind }) => kind === wanted)) return [];
      return [{ path: '/sources', severity: isUnsettled ? 'open' : 'stop', params: { supply } }];
    });
  },
};
