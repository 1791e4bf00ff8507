/** The accounts that the demo data promises, as README.md lists them. */
export const DEMO_PASSWORD = 'wide-berth-demo';

export const DEMO_ACCOUNTS = {
  lead: { email: 'lead@wideberth.example', pin: '246810', name: 'Renata Quillfeather' },
  helper: { email: 'helper@wideberth.example', pin: '135792', name: 'Teo Barrancas' },
  supervisor: { email: 'supervisor@wideberth.example', pin: '864209' },
  safety: { email: 'safety@wideberth.example', pin: '975318' },
} as const;
