import type { signing as en } from '../en/signing';
import type { Words } from '../words';

/** Firmar y refrendar el plan; también las palabras que comparten todas las firmas. */
export const signing: Words<typeof en> = {
  loading: 'Cargando la hoja',
  back: 'Hoja',
  title: { prepared: 'Firmar el plan', countersigned: 'Refrendar el plan' },
  asRole: {
    prepared: (name) => `${name}, como encargado`,
    countersigned: (name) => `${name}, como supervisor`,
  },
  youSign: 'Usted firma esto',
  rows: {
    worksheet: 'Hoja',
    task: 'Tarea',
    place: 'Lugar',
    when: 'Cuándo',
    work: 'Trabajo',
    permit: 'Permiso',
    supply: 'Alimentación',
    distances: 'Distancias',
    who: 'Quién',
    you: 'Usted',
  },
  numbered: (number, revision) => `${number}, revisión ${revision}`,
  off: 'Sin energía, con candado, comprobado sin tensión antes de meter las manos',
  energized: (reason) => `Energizado: ${reason}`,
  ways: (ways, locks) =>
    locks === '' ? `Se abre: ${ways}` : `Se abre: ${ways}. Candados ${locks}`,
  leads: (name) => `${name} dirige`,
  leadsAndTests: (name) => `${name} dirige y prueba`,
  memberStands: (name, closest) => `${name}: ${closest}`,
  memberUnknown: 'sin respuesta sobre qué tan cerca',
  permitNumbered: (number, by) => (by === '' ? number : `${number}, de ${by}`),
  permitNotNeeded: 'No hace falta para esta tarea',
  zone: {
    restricted: 'restringido',
    limited: 'limitado',
    arcFlash: 'arco eléctrico',
    barricade: 'barricada',
  },
  everyField: 'Todos los campos, 12 secciones',
  exceptions: 'Vea primero esto',
  clearedStops: 'Altos que se resolvieron antes de firmar el plan',
  noExceptions: 'Sin precauciones y sin altos resueltos.',
  openQuestion: 'Una pregunta de la cuadrilla sigue sin respuesta. Detiene el refrendo.',

  itMeans: 'Significa',
  meaning: {
    prepared:
      'Yo preparé este plan. Lo que dice es lo que encontré. Lo cumplo, y paro cuando ya no corresponde.',
    acknowledged:
      'Me dijeron qué puede hacerme daño aquí, hasta dónde puedo acercarme y qué no hago. Pude preguntar y me contestaron.',
    countersigned:
      'Leí este plan, sus precauciones y los altos que se resolvieron. No tomo parte en el trabajo. Respondo por mandar a esta cuadrilla.',
  },
  after: {
    crew: (names) =>
      `Todavía no está en vigor: falta que firme ${names}; después refrenda un supervisor. Luego, sin comprobar: trátelo como vivo.`,
    supervisor:
      'Todavía no está en vigor: refrenda un supervisor. Luego, sin comprobar: trátelo como vivo.',
    countersignedOff: (until) =>
      `Con esta firma el plan queda en vigor hasta las ${until}. Sin comprobar: trátelo como vivo.`,
    countersignedEnergized: (until) =>
      `Con esta firma el plan queda en vigor hasta las ${until}. Todo está vivo todo el tiempo.`,
  },

  pinNote: 'Nadie más lo sabe.',
  signature: 'Su firma',
  content: 'Contenido, SHA-256',
  allOfIt: 'Completo',
  lessOfIt: 'Forma corta',
  button: {
    prepared: 'Firmar como encargado',
    acknowledged: 'Firmar',
    countersigned: 'Refrendar como supervisor',
  },
  missing: {
    digits: (count) => (count === 1 ? 'Falta 1 dígito del PIN' : `Faltan ${count} dígitos del PIN`),
    strokes: 'Falta la firma',
    both: 'Faltan el PIN y la firma',
    question: 'Una pregunta sigue sin respuesta',
    points: (count) => (count === 1 ? 'Falta resolver 1 punto' : `Falta resolver ${count} puntos`),
    notSent: 'Lo escrito aún no se envía',
    state: 'No espera esta firma',
  },
  fixed: (revision) =>
    `Una vez firmada, la revisión ${revision} no se puede cambiar. Un cambio hace la revisión ${revision + 1} y pide otra vez todas las firmas.`,

  unsentTitle: 'Lo que escribió aquí no ha llegado al servidor.',
  unsentBody:
    'La firma ampara lo que tiene el servidor. Regrese, espere a que diga Enviado y firme entonces.',
  backToBoard: 'Volver a lo que espera',
  backToWorksheet: 'Volver a la hoja',
  notReadyTitle: 'No está lista para firmar.',
  notReadyBody: 'Siguen estos puntos. Resuélvalos en la hoja y firme después.',
  notAwaited: {
    title: 'Esta firma no se espera.',
    body: (state) => `La hoja está en: ${state}.`,
  },
  noPinTitle: 'No tiene PIN de firma.',
  noPinBody: 'Póngalo en su cuenta y regrese.',
  toAccount: 'A su cuenta',

  wrongPin: 'El PIN está mal. Escríbalo otra vez. Con cinco errores se bloquea 15 minutos.',
  pinLocked: (minutes) =>
    minutes === 1
      ? 'Demasiados PIN equivocados. Espere 1 minuto y escríbalo otra vez. Se mandó un correo.'
      : `Demasiados PIN equivocados. Espere ${minutes} minutos y escríbalo otra vez. Se mandó un correo.`,
  changedTitle: 'Lo que leyó no es el contenido actual.',
  changedBody: 'Cambió mientras tanto. Léalo otra vez y firme. No se firmó nada.',
  readItAgain: 'Leer otra vez',
  movedTitle: 'La hoja ya avanzó.',
  movedBody: 'Ya no espera esta firma. No se firmó nada.',
  conflictTitle: 'Así como está no se puede firmar.',
  conflict: {
    'no-account':
      'Alguien de la cuadrilla no tiene cuenta y no puede firmar. Cambie la cuadrilla en la sección 10.',
    'lead-not-named': 'La cuadrilla no nombra al encargado como encargado. Corrija la sección 10.',
    other:
      'El registro o una pregunta lo impide. Abra la hoja y vea la cuadrilla, los guantes y las preguntas.',
  },
  offline:
    'Sin señal. No se firmó nada; el PIN y los trazos siguen aquí. Vaya donde haya señal y presione otra vez.',

  signedTitle: (time) => `Firmado ${time}`,
  signedBody: {
    crew: (names) => `Todavía no está en vigor. Sigue: ${names}.`,
    supervisor: 'Todavía no está en vigor. Sigue: refrenda un supervisor.',
    inForceOff: 'En vigor. Sin comprobar: trátelo como vivo.',
    inForceEnergized: 'En vigor. Todo está vivo.',
  },
};
