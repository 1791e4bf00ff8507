import type { closeOut as en } from '../en/closeOut';
import type { Words } from '../words';

/** El fin del trabajo, en el orden en que se vuelve a energizar un circuito. */
export const closeOut: Words<typeof en> = {
  loading: 'Cargando la hoja',
  title: 'Cerrar la hoja',
  back: 'Hoja',
  lead: 'En este orden, antes de energizar, ni siquiera por un momento.',
  leadEnergized: 'En este orden, antes de dejar el lugar.',
  locks: (locks) => `Candados ${locks}`,
  staysLocked:
    'Queda con candado. Anote abajo quién tiene los candados y avise al turno siguiente.',
  notesHint: 'Excepciones, lo que quedó, a quién se avisó.',
  seconds: 's',
  record: 'Cerrar la hoja',
  recordNote: 'Cerrar es definitivo. El registro queda en el archivo, sin cambios.',
  button: 'Cerrar como encargado',
  open: (count) => (count === 1 ? 'Queda 1 punto abierto' : `Quedan ${count} puntos abiertos`),
  missingPin: 'Escriba primero su PIN',
  bar: (left) => (left === 0 ? 'Lista para cerrar' : `${left} abiertos`),
  notClosed: 'Sin cerrar',
  notReadyTitle: 'El servidor todavía no la cierra.',
  closedTitle: (time) => `Cerrada ${time}`,
  closedBody: 'Queda en el archivo y no se puede cambiar.',
  moved: 'La hoja ya no espera el cierre.',
  notHereTitle: 'Ahora no hay nada que cerrar.',
  notHereBody: (state) => `La hoja está en: ${state}.`,
  notYours: (name) => `${name} dirige este trabajo y lo cierra.`,
};
