import type { stop as en } from '../en/stop';
import type { Words } from '../words';

/** Dos toques paran el trabajo: Alto, y después un motivo. */
export const stop: Words<typeof en> = {
  loading: 'Cargando la hoja',
  title: 'Parar el trabajo',
  back: 'Hoja',
  body: 'Una sola presión lo para para todos. Dígalo también en voz alta. Nadie puede reprochárselo.',
  reasons: '¿Qué pasa?',
  own: 'Con sus propias palabras',
  ownLabel: 'Por qué se para el trabajo',
  ownSend: 'Parar el trabajo',
  ownEmpty: 'Escriba primero por qué',
  noReason: 'Volver, el trabajo sigue',
  sending: 'Parando',
  notSentTitle: 'Diga alto en voz alta. El trabajo se para ahora.',
  notSentBody:
    'Sin señal: el registro todavía no lo sabe. Queda guardado aquí y se envía en cuanto haya señal.',
  sendAgain: 'Enviarlo otra vez',
  stoppedTitle: 'Detenido: manos fuera',
  stoppedBody:
    'Se avisa a todos. Los candados se quedan puestos. Para seguir hace falta una revisión nueva.',
  stoppedLine: (reason, name, time) => `“${reason}” ${name}, ${time}`,
  toWorksheet: 'A la hoja',
  notHereTitle: 'En el registro no hay nada que parar.',
  notHereBody: (state) =>
    `La hoja está en: ${state}. Si alguien trabaja aquí, diga alto en voz alta.`,
};
