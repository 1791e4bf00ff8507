import type { photos as en } from '../en/photos';
import type { Words } from '../words';

export const photos: Words<typeof en> = {
  title: 'Fotos',
  purpose: {
    supply: 'Directorio del tablero y tapa de la caja',
    sources: 'Dónde se abre cada vía',
    arcFlash: 'Etiqueta del equipo',
    closeOut: 'Trabajo terminado',
  },
  take: 'Tomar una foto',
  choose: 'Elegir fotos',
  hint: 'JPEG, PNG o WebP, 15 MB a lo más. No se guarda el lugar donde se tomó.',
  caption: 'Pie de foto',
  captionHint: 'Qué muestra, por ejemplo: tapa de LP-2, circuito 14.',
  send: 'Enviar esta foto',
  sending: (percent) => `Enviando, ${percent} %`,
  keptHere: 'Guardada en este aparato, sin enviar.',
  again: 'Enviar otra vez',
  drop: 'Dejar esta fuera',
  remove: 'Quitar',
  removeOf: (caption) => `Quitar la foto: ${caption}`,
  removeSure: 'Se borra para siempre. ¿La quita?',
  keep: 'Conservarla',
  open: (caption) => `Abrir la foto: ${caption}`,
  noCaption: 'Sin pie de foto',
  none: 'Sin fotos.',
  most: 'Una hoja lleva 20 fotos a lo más. Quite una primero.',
  frozen: 'La hoja ya se firmó. Sus fotos ya no cambian.',
  failed: {
    type: 'No es una foto JPEG, PNG o WebP. Elija otra.',
    large: 'Pasa de 15 MB. Tómela con menos píxeles.',
    pixels: 'Pasa de 50 millones de píxeles. Tómela con menos.',
    damaged: 'Está dañada o no es foto. Tómela otra vez.',
    offline: 'Sin señal. Queda en este aparato; envíela de nuevo donde haya señal.',
  },
  notHere: 'Las fotos se agregan en el navegador.',
};
