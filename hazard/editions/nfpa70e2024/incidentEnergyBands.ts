import type { IncidentEnergyBands } from '../types';

/** The bands by which clothing is chosen for an incident energy (NFPA 70E-2024 Table 130.5(G)). */
export const incidentEnergyBands: IncidentEnergyBands = {
  citation: 'nfpa70e.incidentEnergyBands',
  fromCalPerCm2: 1.2,
  lowerBandUpToCalPerCm2: 12,
};
