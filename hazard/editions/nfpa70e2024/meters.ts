import type { MeterTable } from '../types';

/** The measurement categories of IEC 61010 that a place of measurement admits. */
export const meters: MeterTable = {
  citation: 'iec61010',
  admitted: {
    'cord-connected': ['II', 'III', 'IV'],
    'fixed wiring': ['III', 'IV'],
    service: ['IV'],
  },
};
