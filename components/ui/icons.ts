/** Symbols on a 24 grid: a 2 px line, square ends and corners, one colour, never filled. */
export const iconPaths = {
  aed: 'M12 20.500C5 14.500 3 11.500 3 8.300A4.600 4.600 0 0 1 12 7a4.600 4.600 0 0 1 9 1.300c0 3.200-2 6.200-9 12.200zM13 8l-2.500 4h3.500L11.500 16',
  'arrow-down': 'M12 4v15M6 13l6 6 6-6',
  'arrow-up': 'M12 20V5M6 11l6-6 6 6',
  backfeed: 'M20 4v8a4 4 0 0 1-4 4H5M9.500 11L4.500 16l5 5',
  barricade: 'M5 21V7M19 21V7M2.500 7h19v6h-19zM7 13l4-6M13 13l4-6',
  board: 'M3 5h18v14H3zM3 10h18M9 10v9',
  breaker: 'M6 3h12v18H6zM12 7v5M9 16.5h6',
  camera:
    'M3 8h5l1.500-3h5L16 8h5v11.500H3zM15.500 13.500a3.500 3.500 0 1 1-7 0 3.500 3.500 0 0 1 7 0z',
  check: 'M4.500 12.500l5 5 10-11',
  clock: 'M12 3.500a8.500 8.500 0 1 0 0 17 8.500 8.500 0 0 0 0-17zM12 7.500V12l3.500 2.500',
  close: 'M6 6l12 12M18 6L6 18',
  'connector-joined': 'M2 12h4M6 8h6v8H6zM12 8h6v8h-6zM18 12h4',
  'connector-parted': 'M2 12h3M5 8h4v8H5zM15 8h4v8h-4zM19 12h3M12 4v3M12 17v3',
  control: 'M2 12h5M17 12h5M7 7h10v10H7zM7 17L17 7',
  document: 'M6 3h8l4 4v14H6zM14 3v4h4M9 12h6M9 16h6',
  down: 'M6 9l6 6 6-6',
  drawing: 'M3 20h18M3 5h18M8 5v4h8V5M12 9v11M8 20l4-11 4 11',
  generator: 'M12 3.5a8.5 8.5 0 1 0 0 17 8.5 8.5 0 0 0 0-17zM7 12c1.7-4.5 3.3-4.5 5 0s3.3 4.5 5 0',
  glove:
    'M8 21h9v-8V6.500a1.500 1.500 0 0 0-3 0V11 4.500a1.500 1.500 0 0 0-3 0V11 6.500a1.500 1.500 0 0 0-3 0V15l-2.200-2.800-2 1.500L8 18.500zM8 18h9',
  inverter: 'M4 4h16v16H4zM20 4L4 20M7 8h4.5M12.5 16.5c1-2 2-2 2.7-.5s1.7 1.500 2.600-.5',
  kept: 'M7 2.500h10v19H7zM9.800 12l1.700 1.800L14.500 10',
  ladder: 'M10.500 3L5 21M13.500 3L19 21M10.500 3h3M9 8h3M8 12h3.200M6.800 16h3.600',
  left: 'M15 6l-6 6 6 6',
  lock: 'M5.5 11h13v9.5h-13zM8.5 11V7.5a3.5 3.5 0 0 1 7 0V11M12 14.5v2.5',
  luminaire: 'M3 6h18M5 6v5h14V6M8 15l-2 4M12 15v5M16 15l2 4',
  meter: 'M6 3h12v12H6zM9 6h6v4H9zM9.500 15v6M14.500 15v6',
  pen: 'M4 20l1-5L16 4l4 4L9 19zM13.500 6.500l4 4',
  person:
    'M14.500 6a2.500 2.500 0 1 1-5 0 2.500 2.500 0 0 1 5 0zM12 9.500V16M7 12h10M8.500 21l3.500-5 3.500 5',
  phone:
    'M6 3h4l1.500 5L9 10c1 2.300 2.700 4 5 5l2-2.500 5 1.500v4c0 1.500-1 2.500-2.500 2.500C10.500 20 4 13.500 3.500 5.500 3.500 4 4.500 3 6 3z',
  plus: 'M12 5v14M5 12h14',
  question: 'M8.500 9a3.500 3.500 0 1 1 5.300 3c-1.200.8-1.800 1.500-1.800 3M12 19v.01',
  refuse:
    'M8.500 21h8l1.500-7V6.500a1.500 1.500 0 0 0-3 0V11 4.500a1.500 1.500 0 0 0-3 0V11 5.500a1.500 1.500 0 0 0-3 0V15l-2.200-2.800-2.200 1.500z',
  register: 'M5 3h14v18H5zM9 8h6M9 12h6M9 16h4',
  right: 'M9 6l6 6-6 6',
  seal: 'M12 3.500a8.500 8.500 0 1 0 0 17 8.500 8.500 0 0 0 0-17zM8.200 12.300l2.600 2.700 5-5.500',
  search: 'M17 10.500a6.500 6.500 0 1 1-13 0 6.500 6.500 0 0 1 13 0zM15.500 15.500L21 21',
  sent: 'M12 20V8M7 12.500l5-5 5 5M5 4h14',
  'shared-neutral': 'M3 6h6l4 6h8M3 18h6l4-6',
  shield:
    'M5.500 9a6.500 6.500 0 0 1 13 0v3c0 5-3.200 8-6.500 9.500C8.700 20 5.500 17 5.500 12zM5.500 9.500h13',
  sun: 'M16 12a4 4 0 1 1-8 0 4 4 0 0 1 8 0zM12 2v3M12 19v3M2 12h3M19 12h3M5 5l2 2M17 17l2 2M19 5l-2 2M7 17l-2 2',
  tag: 'M7 9l5-5.5L17 9v12H7zM12 9.2v.01',
  traveler:
    'M3 12h4M9 11l7-4.5M18 6h3M18 18h3M9 12a1 1 0 1 1-2 0 1 1 0 0 1 2 0zM18 6a1 1 0 1 1-2 0 1 1 0 0 1 2 0zM18 18a1 1 0 1 1-2 0 1 1 0 0 1 2 0z',
  up: 'M6 15l6-6 6 6',
} as const;

export type IconName = keyof typeof iconPaths;

/** The mark: a line that leaves its course to keep one distance from a point. On a 32 by 18 grid. */
export const markLine = 'M0 23.5h5a11 11 0 0 1 22 0h5';
