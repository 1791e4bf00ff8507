import type { caution as en } from '../en/caution';
import type { Words } from '../words';

/** Al pie de cada pantalla (corto) y completo en cada PDF. */
export const caution: Words<typeof en> = {
  short:
    'Esta hoja no da permiso para trabajar. Decide una persona calificada. Primero van la ley, el código local, el programa del patrón, las instrucciones del fabricante y la etiqueta del propio equipo; donde difieran de esta hoja, siga lo más estricto. Trate todo conductor como energizado hasta que esté bloqueado, medido y comprobado sin tensión en el punto de trabajo. Cualquiera puede parar.',
  full: ({ editions, contact, place }) => [
    {
      lead: 'Sin permiso.',
      text: 'Esto ayuda a planear. No es un permiso de trabajo energizado, ni un procedimiento de bloqueo y etiquetado, ni un estudio de arco eléctrico, ni un registro de capacitación, y no sustituye el juicio de una persona calificada frente al equipo.',
    },
    {
      lead: 'Orden.',
      text: 'La ley y la autoridad competente, el programa de seguridad eléctrica del patrón, las instrucciones del fabricante y la etiqueta del equipo van antes que esta hoja. Rige lo más estricto.',
    },
    {
      lead: 'Solo sabe lo que se escribió.',
      text: 'No ve ningún cable. “Nada pendiente, nada detenido” quiere decir que las respuestas no rompieron ninguna regla que conoce. Una respuesta equivocada hace una hoja equivocada.',
    },
    {
      lead: 'Energizado hasta comprobar que no hay tensión.',
      text: 'La posición de un apagador, el directorio del tablero, los planos, los colores, las lámparas apagadas y los probadores sin contacto no comprueban nada. Bloquee, opere cada control, y mida cada conductor de cada fuente en cada punto de trabajo con un medidor verificado antes y después. Mida de nuevo cada vez que se haya ido o algo haya cambiado.',
    },
    {
      lead: 'Cifras.',
      text: `Las distancias, categorías y clasificaciones se toman de ${editions}, en parte de fuentes secundarias públicas; cada una muestra su confianza. Las marcadas “de memoria” o “una sola fuente” se verifican en un ejemplar con licencia antes de confiar en ellas. NFPA, IEEE, IEC, ASTM y OSHA no han revisado ni avalado esta herramienta.`,
    },
    {
      lead: 'Arco eléctrico.',
      text: '“No probable” no es imposible. La ropa con clasificación de arco reduce las quemaduras; no detiene la explosión, el ruido ni los fragmentos. La corriente de falla calculada es un tope, no un estudio; una corriente menor puede quemar más tiempo y peor.',
    },
    {
      lead: 'Choque.',
      text: 'La corriente que se muestra es estadística, para piel seca. Ninguna corriente mostrada aquí es segura. 120 V matan.',
    },
    {
      lead: 'Alcance.',
      text: 'Alumbrado y sus circuitos de 120 a 480 V CA. No es para 347/600 V o más, bancos de CD, solar o almacenamiento, líneas de la compañía, áreas clasificadas ni registros subterráneos. La obra nueva y la remodelación son construcción (29 CFR 1926); los planes estatales y códigos locales pueden pedir más.',
    },
    {
      lead: 'El alumbrado de emergencia fuera de servicio',
      text: 'se avisa a quien administra el edificio, y se suple o se saca a la gente, hasta probarlo otra vez. Una batería descargada necesita un día de carga antes de proteger a alguien.',
    },
    {
      lead: 'Tiempo y lugar.',
      text: 'Vale solo para esta cuadrilla, este lugar, este horario y esta revisión (verifique el código). Con cualquier cambio: pare, nueva revisión, nueva plática.',
    },
    {
      lead: 'Emergencia.',
      text: `No toque a la víctima; abra el circuito; llame a ${contact}; RCP; DEA en ${place}.`,
    },
    {
      lead: 'Parar.',
      text: 'Cualquiera puede parar o negarse, sin dar pruebas y sin castigo.',
    },
  ],
  construction: {
    title: 'Aplican reglas de construcción',
    text: 'La obra nueva y la remodelación son construcción (29 CFR 1926): etiquete el circuito sin energía en cada punto donde se pueda energizar. Los planes estatales y códigos locales pueden pedir más.',
  },
  unfilled: {
    editions: 'NFPA 70E-2024 y 29 CFR 1910, subpartes S e I',
    contact: 'quien indica la hoja',
    place: 'el lugar que indica la hoja',
  },
  firstUse: 'Antes de la primera hoja, lea esto.',
  firstUseRead: 'Leído',
};
