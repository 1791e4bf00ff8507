import type { Words } from '../words';
import type { home as en } from '../en/home';

export const home: Words<typeof en> = {
  role: { lead: 'encargado', helper: 'ayudante', supervisor: 'supervisor', safety: 'seguridad' },
  places: {
    home: 'Inicio',
    board: 'Tablero',
    archive: 'Archivo',
    insights: 'Tendencias',
    people: 'Personas',
    sites: 'Sitios',
    rubberGoods: 'Equipo de hule',
  },
  title: (weekday, day, month) => `${weekday} ${day} de ${month}`,
  waits: 'Le espera a usted',
  nothingWaits: 'Nada le espera.',
  nothingWaitsHelper:
    'Cuando un encargado lo anote en una hoja, aparece aquí para leerla y firmarla.',
  today: 'Hoy',
  worksheets: (count) => (count === 1 ? '1 hoja' : `${count} hojas`),
  nothingToday: 'No hay hojas para hoy.',
  earlier: 'Abiertas de días anteriores',
  later: 'Planeadas para después',
  find: 'Buscar una hoja anterior',
  create: 'Hoja nueva',
  copy: 'A partir de una anterior',
  copyHint:
    'Abra la hoja anterior y elija Copiar. No se copian fechas, candados, permiso ni plática de seguridad.',
  board: 'Abrir el tablero',
  archive: 'Buscar en el archivo',
  keptHere: (count) =>
    count === 1 ? '1 guardada aquí, sin enviar' : `${count} guardadas aquí, sin enviar`,
  allSent: 'Todo enviado',
  asOf: (time) => `Hasta las ${time}`,
  asLastSeen: (time) => `El servidor no responde. Se muestra lo de las ${time}.`,
  number: (number) => `Hoja ${number}`,
  noTask: 'Tarea sin nombrar',
  noPlace: 'Lugar sin nombrar',
  until: (time) => `Hasta las ${time}`,
  overSince: (time) => `El término de las ${time} ya pasó`,
  quoted: (text) => `“${text}”`,
  waiting: {
    notProved: 'Sin comprobar: trátelo como vivo',
    prove: 'Comprobar ausencia de tensión',
    energized: 'Trabajo energizado en vigor',
    open: 'Abrirla',
    returned: (name) => (name === '' ? 'Devuelta' : `Devuelta por ${name}`),
    stopped: (name) => (name === '' ? 'Detenida' : `Detenida por ${name}`),
    revise: (revision) => `Hacer la revisión ${revision}`,
    asks: (name) => `${name} pregunta`,
    answer: 'Responder',
    expired: 'Pasó su término y no se ha cerrado',
    close: 'Cerrarla',
    sign: 'Firmar el plan',
    ready: 'Lista para firmar',
    acknowledge: 'Lea y firme antes de abrir el plafón',
    readAndSign: 'Leer y firmar',
    countersign: 'Espera su firma',
    read: 'Leer y firmar o devolver',
    crewStopped: (name) =>
      name === '' ? 'Detenida: no toque nada' : `Detenida por ${name}: no toque nada`,
    look: 'Ver por qué',
  },
  state: {
    draft: (stops, open) =>
      stops > 0
        ? `Borrador, ${stops} alto, ${open} pendientes`
        : open > 0
          ? `Borrador, ${open} pendientes`
          : 'Borrador, listo para firmar',
    briefing: (count) =>
      count === 1 ? 'Falta 1 de la cuadrilla' : `Faltan ${count} de la cuadrilla`,
    countersign: 'Espera a un supervisor',
    notProved: 'En vigor, trátela como viva',
    proved: 'En vigor, comprobada sin tensión',
    energized: 'En vigor, energizada',
    returned: 'Devuelta',
    stopped: 'Detenida',
    expired: 'Pasó su término y no se ha cerrado',
    void: 'Anulada',
    closed: 'Cerrada',
  },
};
