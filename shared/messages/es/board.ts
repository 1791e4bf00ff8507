import type { board as en } from '../en/board';
import type { Words } from '../words';

export const board: Words<typeof en> = {
  title: 'Tablero',
  loading: 'Cargando el tablero',
  waits: 'Espera su firma',
  waitsForSupervisor: 'Espera a un supervisor',
  waiting: (worksheets, exceptions) => {
    const sheets = worksheets === 1 ? '1 hoja de trabajo' : `${worksheets} hojas de trabajo`;
    if (exceptions === undefined) return sheets;
    return `${sheets}, ${exceptions === 1 ? '1 excepción' : `${exceptions} excepciones`}`;
  },
  nothingWaits: 'Nada espera su firma.',
  nothingWaitsForSupervisor: 'Nada espera a un supervisor.',
  since: (duration) => `Espera ${duration}`,
  revision: (revision) => `Revisión ${revision}`,
  off: 'Sin energía',
  energized: 'Energizado',
  noExceptions: 'Sin excepciones',
  readingExceptions: 'Leyendo las excepciones',
  exceptionsNotRead: 'No se pudieron leer las excepciones. Abra todos los datos.',
  cleared: (place) => `Alto, resuelto antes de firmar (sección ${place})`,
  caution: (title) => `Precaución: ${title}`,
  asked: (name, text) => `${name} preguntó: ${text}`,
  answered: (name, text) => `${name} contestó: ${text}`,
  notAnswered: 'Sin respuesta. Detiene su firma.',
  energizedWork: (reason) => `Trabajo energizado: ${reason}`,
  permit: (number) => `Permiso ${number}.`,
  noPermit: 'Esta tarea no necesita permiso.',
  signedElsewhere: (signer, name) => `${signer} firmó en la sesión de ${name}`,
  signedElsewhereNote: 'Se le mandó un correo a quien firmó.',
  withoutSignal: (signer) => `${signer} firmó sin señal`,
  withoutSignalNote: (at) => `Firmado ${at}, recibido después.`,
  deviates: (count, number) =>
    count === 1
      ? `1 respuesta es distinta de ${number}`
      : `${count} respuestas son distintas de ${number}`,
  deviatesNote: (when) => `La última hoja de trabajo en este lugar, ${when}.`,
  deviation: (label, was, is) => `${label}: ${is}, antes ${was}`,
  more: (count) => (count === 1 ? 'y 1 más' : `y ${count} más`),
  everyField: 'Todos los datos',
  sendBack: 'Devolver',
  countersign: 'Refrendar',
  readAndSign: 'Leer y firmar',
  read: 'Leerla',
  heldByQuestion: 'Una pregunta no tiene respuesta',

  inForce: 'En vigor ahora',
  counts: (inForce, over, stopped) =>
    [
      `${inForce} en vigor`,
      over > 0 ? `${over} fuera de tiempo` : '',
      stopped > 0 ? (stopped === 1 ? '1 detenida' : `${stopped} detenidas`) : '',
    ]
      .filter((part) => part !== '')
      .join(', '),
  nothingInForce: 'Nada está en vigor.',
  now: (time) => `Ahora, ${time}`,
  crew: (lead, others) => (others === 0 ? lead : `${lead} y ${others}`),
  bar: {
    energized: 'Energizado',
    notProved: 'Sin comprobar: trátelo como vivo',
    proved: 'Comprobado sin tensión',
    over: (duration) => `${duration} de más, sin cerrar`,
    stopped: (time, name) => (name === '' ? `Detenida ${time}` : `Detenida ${time} por ${name}`),
    waitsForYou: 'Espera su firma',
    waitsForSupervisor: 'Espera a un supervisor',
    waitsForCrew: (count) =>
      count === 1 ? 'Espera a 1 de la cuadrilla' : `Espera a ${count} de la cuadrilla`,
  },
  window: (from, to) => `${from} a ${to}`,
  zone: (zone) => `Hora del sitio, ${zone}`,
};
