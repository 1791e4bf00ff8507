import type { problems as en } from '../en/problems';
import type { Words } from '../words';

/** Qué pasó y qué hacer, por nombre del problema. */
export const problems: Words<typeof en> = {
  'invalid-input': {
    title: 'Hay campos que no están bien.',
    remedy: 'Corrija los campos que se indican abajo.',
  },
  'not-ready': {
    title: 'La hoja no está lista para esto.',
    remedy: 'Primero resuelva los altos y pendientes.',
  },
  'not-signed-in': {
    title: 'Su sesión terminó.',
    remedy: 'Inicie sesión. Lo que escribió se conserva.',
  },
  'wrong-credentials': {
    title: 'El correo o la contraseña no es correcto.',
    remedy: 'Revise los dos e intente de nuevo.',
  },
  'not-allowed': {
    title: 'Esto no le corresponde.',
    remedy: 'Pídalo al encargado, al supervisor o a la oficina de seguridad.',
  },
  'foreign-origin': {
    title: 'La solicitud vino de otro sitio.',
    remedy: 'Abra Wideberth en su propia dirección e intente de nuevo.',
  },
  'wrong-password': { title: 'La contraseña no es correcta.', remedy: 'Escríbala de nuevo.' },
  'wrong-pin': {
    title: 'El NIP no es correcto.',
    remedy: 'Escríbalo de nuevo. Con cinco errores se bloquea 15 minutos.',
  },
  'not-found': {
    title: 'No se encontró.',
    remedy: 'No está aquí o no le corresponde verlo. Vuelva a la lista.',
  },
  'stale-version': {
    title: 'Alguien guardó otra versión antes.',
    remedy: 'Vea las dos y elija qué conservar.',
  },
  'wrong-state': { title: 'La hoja ya avanzó.', remedy: 'Cárguela de nuevo y vea qué espera.' },
  'hash-mismatch': {
    title: 'Lo que vio no es el contenido actual.',
    remedy: 'Léalo otra vez y luego firme.',
  },
  'id-taken': {
    title: 'Este identificador ya está ocupado.',
    remedy: 'Intente de nuevo; se genera otro.',
  },
  conflict: { title: 'Esto choca con otro registro.', remedy: 'Vea primero el otro registro.' },
  'too-many-requests': { title: 'Demasiados intentos.', remedy: 'Espere e intente de nuevo.' },
  'malformed-request': {
    title: 'El servidor no pudo leer la solicitud.',
    remedy: 'Cargue la página otra vez e intente de nuevo.',
  },
  'took-too-long': {
    title: 'Esto tardó demasiado.',
    remedy: 'Pida menos a la vez, o intente más tarde.',
  },
  unavailable: {
    title: 'El servidor no alcanza su base de datos.',
    remedy: 'Lo que escribió se conserva en este dispositivo. Intente en un minuto.',
  },
  unexpected: {
    title: 'El servidor falló con esto.',
    remedy:
      'Lo que escribió se conserva en este dispositivo. Intente de nuevo; si sigue, avise a la oficina de seguridad.',
  },
  offline: {
    title: 'Sin señal.',
    remedy: 'Lo que escribió se conserva en este dispositivo y se envía cuando haya señal.',
  },
};
