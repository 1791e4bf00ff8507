import type { problems as en } from '../en/problems';
import type { Words } from '../words';

/** Qué pasó y qué hacer, por nombre del problema. */
export const problems: Words<typeof en> = {
  'invalid-input': {
    title: 'Hay campos que no están bien.',
    todo: 'Corrija los campos que se indican abajo.',
  },
  'not-ready': {
    title: 'La hoja no está lista para esto.',
    todo: 'Primero resuelva los altos y pendientes.',
  },
  'not-signed-in': {
    title: 'Su sesión terminó.',
    todo: 'Inicie sesión. Lo que escribió se conserva.',
  },
  'wrong-credentials': {
    title: 'El correo o la contraseña no es correcto.',
    todo: 'Revise los dos e intente de nuevo.',
  },
  'not-allowed': {
    title: 'Esto no le corresponde.',
    todo: 'Pídalo al encargado, al supervisor o a la oficina de seguridad.',
  },
  'foreign-origin': {
    title: 'La solicitud vino de otro sitio.',
    todo: 'Abra Wideberth en su propia dirección e intente de nuevo.',
  },
  'wrong-password': { title: 'La contraseña no es correcta.', todo: 'Escríbala de nuevo.' },
  'wrong-pin': {
    title: 'El NIP no es correcto.',
    todo: 'Escríbalo de nuevo. Con cinco errores se bloquea 15 minutos.',
  },
  'not-found': {
    title: 'No se encontró.',
    todo: 'No está aquí o no le corresponde verlo. Vuelva a la lista.',
  },
  'stale-version': {
    title: 'Alguien guardó otra versión antes.',
    todo: 'Vea las dos y elija qué conservar.',
  },
  'wrong-state': { title: 'La hoja ya avanzó.', todo: 'Cárguela de nuevo y vea qué espera.' },
  'hash-mismatch': {
    title: 'Lo que vio no es el contenido actual.',
    todo: 'Léalo otra vez y luego firme.',
  },
  'id-taken': {
    title: 'Este identificador ya está ocupado.',
    todo: 'Intente de nuevo; se genera otro.',
  },
  conflict: { title: 'Esto choca con otro registro.', todo: 'Vea primero el otro registro.' },
  'too-many-requests': { title: 'Demasiados intentos.', todo: 'Espere e intente de nuevo.' },
  'malformed-request': {
    title: 'El servidor no pudo leer la solicitud.',
    todo: 'Cargue la página otra vez e intente de nuevo.',
  },
  'took-too-long': {
    title: 'Esto tardó demasiado.',
    todo: 'Pida menos a la vez, o intente más tarde.',
  },
  unavailable: {
    title: 'El servidor no alcanza su base de datos.',
    todo: 'Lo que escribió se conserva en este dispositivo. Intente en un minuto.',
  },
  unexpected: {
    title: 'El servidor falló con esto.',
    todo: 'Lo que escribió se conserva en este dispositivo. Intente de nuevo; si sigue, avise a la oficina de seguridad.',
  },
  offline: {
    title: 'Sin señal.',
    todo: 'Lo que escribió se conserva en este dispositivo y se envía cuando haya señal.',
  },
};
