import type { helper as en } from '../en/helper';
import type { Words } from '../words';

/** La página del ayudante: se lee en un minuto; preguntar, negarse o firmar. */
export const helper: Words<typeof en> = {
  loading: 'Cargando su plática',
  titleCeiling: (name) => `${name}, un minuto antes de abrir el techo`,
  title: (name) => `${name}, un minuto antes de empezar`,
  leads: (name) => `Dirige ${name}.`,

  canHurt: 'Qué puede hacerle daño aquí',
  toGround: 'del cable a todo lo conectado a tierra',
  toGroundAt: (surfaces) => `del cable a todo lo conectado a tierra: ${surfaces}`,
  betweenWires: 'de un cable a otro; y cada cable hace daño contra todo lo conectado a tierra',
  betweenWiresAt: (surfaces) =>
    `de un cable a otro; y cada cable hace daño contra todo lo conectado a tierra: ${surfaces}`,
  voltsNotKnown: 'No se sabe la tensión. No entre hasta que se sepa.',
  off: {
    before: 'Se apaga y se pone candado. ',
    strong: 'Aún se considera energizado',
    after: (name) => ` hasta que ${name} lo haya probado y lo diga.`,
  },
  energized: {
    before: 'Aquí no se apaga nada. ',
    strong: 'Está energizado todo el tiempo',
    after: '.',
  },
  ways: {
    normal: '',
    'unswitched hot': 'Un cable sigue vivo aunque el apagador esté apagado.',
    generator: 'Una planta puede arrancar sola y volver a energizarlo.',
    'battery unit':
      'Una batería dentro de la luminaria da la tensión completa con el termomagnético abierto.',
    'central inverter':
      'Un sistema de baterías del edificio puede energizarlo con el termomagnético abierto.',
    traveler: 'Otro apagador puede energizar un cable.',
    'shared neutral': 'El cable blanco puede llevar corriente de otro circuito.',
    control: 'Los cables de control tienen su propia alimentación.',
    backfeed: 'Puede regresar tensión de otro circuito.',
  },
  arcFlash: (distance) => `Un arco eléctrico quema hasta ${distance}. Llega sin aviso.`,

  current: 'Corriente a través del cuerpo',
  effect: {
    slight: '5 mA, choque leve',
    letGo: '6 a 30, no puede soltar',
    breathing: '50 a 150, paro respiratorio',
    heart: 'desde 1000, para el corazón',
  },
  here: (low, high) => `Aquí, ${low} a ${high}`,
  currentBasis: (volts, low, high) =>
    `A ${volts}, de mano a mano, piel seca: ${low} a ${high} mA. Piel mojada o herida: más. Ninguna corriente de aquí es inofensiva.`,
  effects: 'Efectos: OSHA 3075.',

  howClose: 'Hasta dónde puede acercarse',
  noFigure: 'No entre',
  noFigureBody: 'No se saben las distancias. No entre hasta que se sepan.',
  stay: {
    barricade: 'Quédese fuera de la barricada',
    limited: 'Quédese fuera del límite de aproximación limitado',
    escorted: (name) => `No más cerca, y solo con ${name} a su lado`,
    restricted: 'No más cerca: es el límite restringido',
    inside: 'Usted entra: guantes dieléctricos puestos, probados con aire, con cuero encima',
    noTouch: 'No toque nada',
  },
  stayNote: {
    barricade: (name) => `Aunque ${name} le pida que se acerque.`,
    arcFlash: (distance) => `Más cerca de ${distance}, solo con ropa contra arco.`,
    off: (name) => `Hasta que ${name} diga que no hay tensión.`,
    energized: 'Todo el tiempo.',
  },
  you: 'Usted',
  stripLabel: (where) => `Distancias, a escala. Usted: ${where}.`,
  ended: (time) =>
    `Comprobado sin tensión ${time}. Ahí terminaron las distancias, en los puntos nombrados.`,

  doNot: 'Lo que usted no hace',
  doNots: {
    barricade: 'Cruzar la barricada o pasar algo por encima',
    closer: (distance) => `Acercarse a menos de ${distance}, o alcanzar con algo largo`,
    bare: 'Entrar sin guantes, o con anillo, reloj o cadena',
    grid: 'Tocar la retícula del plafón, una luminaria o un cable suelto',
    metal: (surfaces) => `Tocar esto: ${surfaces}, una luminaria, un cable suelto`,
    cable: 'Tocar una luminaria o un cable suelto',
    switches: 'Usar un apagador o un termomagnético',
    locks: 'Quitar un candado o una etiqueta',
  },
  do: 'Lo que usted hace',
  dos: {
    keepOut: 'No deja entrar a nadie',
    watch: (name) => `Observa a ${name} todo el tiempo`,
    lock: 'Pone su propio candado y etiqueta, y quita solo los suyos',
    stop: 'Dice alto, en voz alta, si algo se ve mal',
  },
  cautions: 'Sepa también esto',

  hurt: {
    title: 'Si alguien se lastima',
    noTouch: 'No toque a la persona',
    open: (panel) => `Abra el circuito en el tablero ${panel}`,
    call: (contact) => `Llame: ${contact}`,
    rescue: (rescue) => `Rescate: ${rescue}`,
    firstAid: (name) => `Primeros auxilios: ${name}`,
    aed: (place) => `DEA: ${place}`,
  },
  theEnd: 'Fin de la plática',

  holds: 'Una pregunta o un no detiene el trabajo. Nadie puede reprochárselo.',
  question: 'Tengo una pregunta',
  refuse: 'No haré esto',
  understand: 'Entiendo',
  readToEnd: 'Lea primero hasta el final',
  notAwaited: 'Su firma no se espera ahora',
  signed: (time) => `Firmado ${time}`,
  needsSignal: 'Para firmar hace falta señal',

  askTitle: 'Su pregunta',
  askBody: (name) => `Le llega a ${name}. Nadie refrenda antes de que la conteste.`,
  askLabel: '¿Qué quiere saber?',
  askSend: 'Enviar la pregunta',
  askEmpty: 'Escriba primero la pregunta',
  askBack: 'Volver a la plática',
  asked: 'Su pregunta se envió. Detiene el refrendo hasta que la contesten.',
  askedBy: (name, text) => `${name}: ${text}`,
  mayNotAsk: 'Pregunte en voz alta. En este momento no se puede registrar.',

  refuseTitle: 'Usted dice que no',
  refuseBody:
    'Una sola presión para el trabajo de todos. No tiene que dar motivo. Nadie puede reprochárselo.',
  refusedFor: (name, reason) => `${name}: ${reason}`,

  signTitle: (name) => `Firma ${name}`,
  signOwn: 'en su propio teléfono',
  signOn: (name) => `en el teléfono de ${name}`,
  readAgain: 'Leer otra vez',
  workOff: (name) => `Sin energía. Se considera vivo hasta que ${name} lo haya comprobado`,
  workEnergized: 'Energizado. Está vivo todo el tiempo',
  orFarther: 'o más lejos',
  ownPin: 'Su propio PIN de firma, 6 dígitos',
  ownPinOn: (name) => `Su propio PIN, 6 dígitos. ${name} no lo sabe`,
  recordSays: (name) =>
    `El registro dice que se firmó en el teléfono de ${name}. A usted le llega un correo.`,
  giveBack: 'Devolver el teléfono, sin firmar',
  signedTitle: 'Firmado.',
  signedBody: 'No meta las manos hasta que el encargado diga que no hay tensión.',
  signedBodyEnergized: 'Está vivo todo el tiempo. Guarde su distancia.',
  giveBackSigned: (name) => `Devolver el teléfono a ${name}`,
};
