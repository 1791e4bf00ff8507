/** Whether an energized work permit is needed, why, and by which exemption not. */
export const permit = {
  required: 'An energized work permit is required.',
  notRequired: 'No energized work permit is required.',
  because: {
    'absence test':
      'The test for absence of voltage is energized work until it reads zero. It needs no permit; boundaries and protective equipment apply.',
    testing:
      'Testing by a qualified person needs no permit; boundaries and protective equipment apply.',
    'inspection outside restricted':
      'Looking on, covers on and nobody inside the restricted boundary, needs no permit; protective equipment still applies.',
    'inside restricted': 'Someone is or may be inside the restricted boundary.',
    'arc flash likely': 'An arc flash is likely.',
    'below 50 V': 'Everything worked on or exposed is below 50 V.',
    'nobody inside': 'Nobody comes inside the restricted boundary, and an arc flash is not likely.',
  },
  exemption: {
    '130.2(C)(1)': 'Exempt as testing, troubleshooting or voltage measuring.',
    '130.2(C)(2)': 'Exempt as thermography or visual inspection outside the restricted boundary.',
  },
  stillProtected: 'Exempt from the permit is never exempt from protective equipment.',
};
