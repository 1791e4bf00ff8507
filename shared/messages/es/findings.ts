import type { findings as en } from '../en/findings';
import type { Words } from '../words';

/** Las palabras de cada hallazgo: qué pasa y luego qué hacer. */
export const findings: Words<typeof en> = {
  'job.outside-scope': {
    title: 'Fuera de lo que cubre esta hoja',
    stop: '[{special}: ]esta hoja no lo cubre. No lo planee aquí; llévelo con quien tiene el procedimiento para eso.',
    open: 'No se ha dicho si hay algo fuera del alcance de esta hoja. Búsquelo y conteste en la sección 1.',
  },
  'supply.voltage-not-of-system': {
    title: 'La tensión del circuito no es del sistema',
    stop: '[{volts:V} ]no es tensión de circuito de este sistema[ ({system})]. Corrija el sistema o la tensión; 120 V junto a 480Y/277 V viene de un transformador y es otro sistema.',
    open: 'Falta la tensión del circuito. Léala en el tablero y conteste en la sección 2.',
    'open/system': 'Falta el sistema. Léalo en el tablero y conteste en la sección 2.',
  },
  'supply.readings-do-not-fit': {
    title: 'Las lecturas no corresponden al sistema',
    stop: 'Las tensiones leídas no corresponden al sistema declarado[ ({system})][. Corresponden a {fits:system}]. Averigüe qué alimentación es y corrija la sección 2.',
    open: 'Hay lecturas, pero falta el sistema. Indíquelo en la sección 2.',
  },
  'supply.high-leg': {
    title: 'Hay fase alta',
    caution:
      'Una fase de esta alimentación da unos 208 V a neutro. Ubique el conductor naranja, no conecte ahí alumbrado y mida todas las fases.',
  },
  'supply.colors-do-not-fit': {
    title: 'Color de conductor de otro sistema',
    caution:
      '[{color:conductorColor} ]se acostumbra en otro sistema, no en el declarado. Mida la tensión; el color no comprueba nada.',
  },
  'supply.tripped': {
    title: 'Se disparó el termomagnético',
    stop: 'El termomagnético se disparó y no se encontró la causa. No lo vuelva a cerrar; primero encuentre y repare la falla.',
    open: 'No se ha dicho si el termomagnético se disparó. Revíselo, pregunte y conteste en la sección 2.',
    caution:
      'El termomagnético se disparó y no se encontró la causa. Busque la falla con el circuito abierto; no lo cierre para probar.',
  },
  'sources.none': {
    title: 'No hay fuentes en la lista',
    open: 'No hay ninguna fuente de energía en la lista. Agregue cada una en la sección 3, primero el circuito derivado normal.',
  },
  'sources.egress-unknown': {
    title: 'No se sabe qué alimenta la emergencia',
    stop: 'Nadie sabe de dónde se alimenta el alumbrado de emergencia. Averígüelo antes de abrir algo: pilotos de carga, tableros de emergencia, planos del edificio.',
    open: 'Dice que no hay ninguna y también indica una. Vuelva a ver y deje solo una de las dos en la sección 3.',
    'open:unanswered':
      'Falta contestar de dónde se alimenta el alumbrado de emergencia. Busque pilotos de carga y tableros de emergencia, y conteste en la sección 3.',
  },
  'sources.egress-not-listed': {
    title: 'Falta la fuente de emergencia',
    stop: 'La alimentación de emergencia[ ({supply:egressSupply})] llega a este equipo y no está en la lista. Agréguela en la sección 3, con el lugar donde se abre.',
    open: 'La alimentación de emergencia[ ({supply:egressSupply})] llega a este equipo y la lista de fuentes no está completa. Agréguela y ponga el tipo de cada fuente en la sección 3.',
  },
  'sources.switch-only': {
    title: 'Un apagador o control no cuenta como abierto',
    stop: '{way} se abre solo en un apagador o dispositivo de control[ ({openedAt})]. Con o sin cinta, nunca cuenta como abierto. Abra el termomagnético o un desconectador y póngale candado.',
  },
  'sources.not-opened': {
    title: 'Una fuente sigue cerrada',
    stop: '{way} no se abre. Ábrala en un termomagnético, desconectador, fusible o clavija y márquelo en la sección 3.',
    open: '{way}: falta decir dónde se abre. Elíjalo en la sección 3.',
  },
  'sources.not-locked': {
    title: 'No está bloqueada como se debe',
    stop: '{way} no se mantiene abierta como se debe[ (ahora: {held})]. Ponga candado y etiqueta. La etiqueta sola necesita una segunda medida; el candado solo sirve para un dispositivo en un turno; tenerla en la mano, solo para clavija o conector de batería.',
    open: '{way}: falta decir con qué se mantiene abierta. Ponga candado y etiqueta y anótelo en la sección 3.',
    'open/openedAt':
      '{way} está en manos de quien trabaja y falta decir dónde se abre. Elíjalo en la sección 3.',
    'open/lockNumber':
      '{way}: falta el número del candado. Léalo en el candado y anótelo en la sección 3.',
  },
  'sources.battery-connected': {
    title: 'La batería sigue conectada',
    stop: '{way} sigue conectada. Su salida puede tener tensión de línea con todos los termomagnéticos abiertos. Separe el conector en la luminaria y márquelo aquí; si no se puede separar, esta hoja no sigue.',
    open: 'Se va a cambiar una unidad de batería y no hay ninguna en la lista. Agréguela en la sección 3 y separe su conector.',
    'open/openedAt':
      '{way}: no está marcada como separada. Separe el conector en la luminaria y márquelo en la sección 3.',
  },
  'sources.by-unqualified': {
    title: 'Bloquea o mide alguien sin calificar',
    stop: '{who} bloquea o mide[ la {way}] y no es persona calificada de esta cuadrilla. Encárguelo a quien sí lo es.',
    open: 'Falta decir si {who}, que bloquea o mide[ la {way}], es persona calificada. Conteste en la sección 10.',
    'open:unanswered':
      'No se ha dicho quién abre y bloquea, o quién mide[: {way}]. Nombre a una persona calificada de esta cuadrilla.',
  },
  'sources.traveler-unlisted': {
    title: 'Falta el puente de tres vías',
    open: 'Hay apagadores en dos o más lugares y no hay puente de tres vías en la lista. Camine hasta cada apagador y agréguelo en la sección 3.',
    'open:unanswered':
      'Falta decir cómo se enciende, así que puede faltar un puente de tres vías. Recorra el área y conteste en la sección 2.',
  },
  'sources.shared-neutral': {
    title: 'Neutro compartido',
    stop: '{way}: no se abren todas las fases que comparten el neutro. Ábralas y bloquéelas todas; un neutro abierto puede quedar a tensión de línea.',
    open: 'El neutro es compartido y no está en la lista. Agréguelo en la sección 3 con todas sus fases.',
    'open/allPhasesOpened':
      '{way}: falta decir si se abren todas las fases que comparten el neutro. Rastréelas y conteste en la sección 3.',
  },
  'sources.opened-before-transfer': {
    title: 'Se abre antes de la transferencia',
    stop: '{way} se abre antes de la transferencia: la planta vuelve a energizar el circuito en segundos. Abra el termomagnético del lado de la carga.',
    open: '{way}: falta decir de qué lado de la transferencia se abre. Rastréelo y conteste en la sección 3.',
  },
  'sources.transfer-starts': {
    title: 'La emergencia va a arrancar',
    caution:
      'Al abrir la alimentación normal arranca la de emergencia. Es de esperarse que haya luces encendidas; eso no quiere decir que se abrió el termomagnético equivocado.',
  },
  'sources.neutral-not-checked': {
    title: 'Corriente en el neutro',
    stop: '[{amperes:A} ]circula por el neutro: otro circuito lo comparte. No lo abra; encuentre y abra el otro circuito, y mida otra vez con gancho.',
    open: 'El neutro es o puede ser compartido y falta la lectura de gancho. Mida antes de abrirlo y anote los amperes.',
  },
  'sources.live-neighbor': {
    title: 'Partes vivas junto al trabajo',
    stop: 'En la misma caja o tablero quedan partes vivas sin resguardo. Cúbralas con aislante adecuado o ábralas también.',
    open: 'No se ha dicho si en la misma caja o tablero quedan partes vivas. Revise; con solo el principal del tablero abierto, sus zapatas de línea siguen vivas. Conteste con la comprobación.',
  },
  'sources.control-unlisted': {
    title: 'Falta el cableado de control',
    open: 'El encendido es automático o no se sabe, y no hay cableado de control en la lista. Encuentre qué alimenta el sensor, el relevador o el par de atenuación y agréguelo en la sección 3.',
    'open:unanswered':
      'Falta decir cómo se enciende, así que puede faltar cableado de control. Conteste en la sección 2.',
  },
  'sources.stored-energy': {
    title: 'Energía almacenada',
    open: 'La energía almacenada no está descargada. Espere, descargue y mida la salida del driver, balastro o batería, y anótelo con la comprobación.',
    'open:unanswered':
      'Falta contestar la energía almacenada. Mida la salida del driver, balastro o batería, descárguela y anótelo con la comprobación.',
  },
  'sources.not-everyone-locked': {
    title: 'No todos han puesto candado',
    open: '{way}: no todos los que trabajan en el circuito tienen su candado[ (falta: {names})]. Cada quien pone el suyo, en el dispositivo o en la caja de bloqueo de grupo.',
  },
  'decision.unjustified': {
    title: 'Energizado sin razón admitida',
    stop: 'Se planea trabajo energizado sin una razón admitida[ para esta tarea ({task})]. Corte la energía, o dé una razón que el reglamento admita.',
    open: 'Se planea trabajo energizado y las razones admitidas dependen de la tarea. Elija la tarea en la sección 1.',
  },
  'decision.explanation-missing': {
    title: 'Falta la explicación',
    open: 'No se ha explicado por qué se queda energizado. Escríbalo en la sección 4 con sus palabras.',
  },
  'decision.below-fifty-not-so': {
    title: 'No todo está abajo de 50 V',
    stop: 'Se trabaja o queda expuesto a 50 V o más[ ({volts:V})]. Entonces estar abajo de 50 V no es razón; corte la energía.',
    open: 'La razón es que está abajo de 50 V y falta la mayor tensión que se trabaja. Anótela en la sección 2.',
    'open/higherVoltsExposed':
      'La razón es que está abajo de 50 V y falta decir si hay algo mayor expuesto. Véalo y conteste en la sección 2.',
  },
  'decision.testing-is-not-repair': {
    title: 'Medir no es razón para reparar energizado',
    stop: 'La medición no admite reparación[ ({task})]. Mida y luego corte la energía para reparar.',
  },
  'decision.infeasible-not-admitted': {
    title: 'Motivo no admitido',
    stop: 'Ese motivo no impide cortar la energía. La comodidad, los inquilinos, las ventas perdidas y el tiempo extra no se admiten, y medir no es motivo para reparar. Planee el corte.',
    open: 'Falta contestar por qué no se puede sin energía. Elíjalo en la sección 4.',
    'open/task': 'El motivo es una medición y falta la tarea. Elija la tarea en la sección 1.',
    caution:
      'El motivo es un proceso industrial continuo. El alumbrado de un edificio casi nunca es parte de uno. Que lo vea el supervisor.',
  },
  'decision.alternative-possible': {
    title: 'Hay otra manera',
    stop: 'Se puede poner luz temporal, así que la oscuridad no es razón. Póngala y corte la energía.',
    open: 'Todavía no se descarta otra manera. Conteste en la sección 4.',
    'open/outageRefusedBy':
      'No se indica quién administra el edificio y negó el corte. Pregúntele y anote quién lo negó.',
    'open/hazard':
      'Falta decir qué peligro mayor traería cortar la energía. Elíjalo en la sección 4.',
    'open/temporaryLight':
      'Falta decir si se puede poner luz temporal. Véalo y conteste en la sección 4.',
  },
  'permit.missing': {
    title: 'Permiso de trabajo energizado',
    stop: 'El permiso no vale para este trabajo. Consiga uno que valga.',
    'stop/approvedBy':
      'El permiso lo firma alguien de la cuadrilla[, {who}]. Que lo firme alguien de fuera.',
    'stop/validUntil':
      'El permiso vence antes de que termine el trabajo. Consiga uno que alcance, o termine antes.',
    open: 'Se requiere permiso de trabajo energizado. Anote su número, quién lo firmó y hasta cuándo vale.',
    'open/number':
      'Se requiere permiso de trabajo energizado y falta su número. Consiga el permiso y anótelo.',
    'open/approvedBy':
      'Se requiere permiso de trabajo energizado y falta quién lo firmó. Anote su nombre.',
    'open/validUntil':
      'Se requiere permiso de trabajo energizado y falta hasta cuándo vale. Anote fecha y hora.',
  },
  'absence.source-not-opened': {
    title: 'Apertura sin confirmar',
    stop: '{way} no está confirmada como abierta, asegurada y probada. Vaya, pruébela y confírmela antes de medir.',
    open: 'Falta contestar qué fuentes se abrieron, aseguraron y probaron. Confirme cada una antes de medir.',
  },
  'absence.proximity-tester': {
    title: 'Probador sin contacto',
    stop: 'Un probador sin contacto nunca comprueba la ausencia de tensión. Use uno de contacto.',
    open: 'No se ha elegido el instrumento. Elija el probador de contacto en la sección 5.',
  },
  'absence.meter-category': {
    title: 'Medidor no apto para este lugar',
    stop: 'El probador no es apto para este lugar. Use uno que lo sea, con sus cables.',
    'stop/category':
      'El probador[, {category},] no es apto para este lugar. La instalación fija pide CAT III o IV, la acometida CAT IV, también los cables.',
    'stop/ratedVolts':
      'El probador es[ de {ratedVolts:V},] de menos tensión que la alimentación[, {volts:V} entre fases]. Use uno que la soporte, con sus cables.',
    open: 'Falta la categoría o la tensión nominal del probador. Léalas en el medidor y los cables, y anote la menor.',
    'open/atService':
      'No se ha dicho si es en la acometida, donde el medidor debe ser CAT IV. Conteste en la sección 2.',
  },
  'absence.not-proved': {
    title: 'Probador sin verificar antes y después',
    open: 'El probador no se verificó en una fuente viva conocida antes y después de medir. Verifíquelo y marque las dos.',
    'open/provedBefore':
      'El probador no se verificó en una fuente viva conocida antes de medir. Verifíquelo, mida y márquelo.',
    'open/provedAfter':
      'El probador no se verificó en una fuente viva conocida después de medir. Verifíquelo otra vez y márquelo; si falla, las lecturas no valen.',
  },
  'absence.pairs-missing': {
    title: 'Faltan lecturas',
    open: '{point}: faltan lecturas[ ({pairs})]. Mida cada par en cada punto de trabajo y anote cada lectura.',
    'open/pointsOfWork':
      'Falta decir cuántos puntos de trabajo hay, así que ninguna prueba está completa. Cuéntelos y conteste en la sección 1.',
  },
  'absence.voltage-present': {
    title: 'Hay tensión',
    stop: '{point}: hay {volts:reading}[, {pair}]. Está vivo. Retírese, pare el trabajo y encuentre la fuente que falta.',
  },
  'absence.stray-voltage': {
    title: 'Tensión residual',
    stop: '{point}: quedan {volts:reading}[, {pair}]. Encuentre de dónde viene, o mida otra vez con un medidor de baja impedancia.',
  },
  'absence.controls-not-operated': {
    title: 'Controles sin operar',
    stop: 'No todos los controles se pusieron en ENCENDIDO. 0 V detrás de un apagador abierto no comprueba nada. Encienda cada uno, cada tres vías en sus dos posiciones, y mida otra vez.',
    open: 'No se ha dicho si cada control se puso en ENCENDIDO. Opere cada uno, cada tres vías en sus dos posiciones, antes y durante la prueba.',
  },
  'absence.source-not-tested': {
    title: 'Una fuente sin medir',
    open: '{way}: sus conductores no se han medido[ en {point}][ contra {to:conductor}]. Mida cada uno a tierra y a cada fase en cada punto al que llega.',
  },
  'absence.dc-not-tested': {
    title: 'Falta medir CD',
    open: '{way}: no hay lectura de CD[ en {point}]. La escala de CA no ve una batería ni la salida de un driver. Cambie a CD y mida.',
  },
  'absence.leads-not-inspected': {
    title: 'Cables sin revisar',
    open: 'Instrumento, cables y puntas no están marcados como revisados. Revíselos, con la categoría de los cables, y márquelo.',
  },
  'shock.unqualified-inside': {
    title: 'Alguien sin calificar se acerca demasiado',
    stop: '{who} no es persona calificada y se acerca demasiado[: {closest}]. Que se quede fuera del límite limitado, o póngale una escolta calificada donde se admite.',
    open: '{who} se acerca[: {closest}], y falta decir si es persona calificada. Conteste en la sección 10.',
    'open:unanswered': 'Falta decir qué tanto se acerca {who}. Conteste en la sección 10.',
  },
  'shock.gloves-missing': {
    title: 'Faltan guantes dieléctricos',
    stop: '{who} entra al límite restringido y no tiene guantes dieléctricos. Elija un par del registro.',
    open: '{who} entra al límite restringido y no se han indicado guantes. Elija un par en la sección 8.',
  },
  'shock.gloves-class': {
    title: 'Clase de guantes insuficiente',
    stop: 'Los guantes de {who}[, clase {class},] no bastan[ para {volts:V}]. Use un par de clase mayor; la sección 8 la indica.',
    open: 'Falta la clase de los guantes de {who}. Léala en el puño.',
  },
  'shock.gloves-overdue': {
    title: 'Guantes fuera de prueba',
    stop: 'Los guantes de {who} están fuera de prueba[ desde el {dueOn}]. Déjelos y use un par con prueba vigente.',
    open: 'Falta la última prueba de los guantes de {who}. Lea el sello y anote la fecha.',
  },
  'shock.gloves-not-air-tested': {
    title: 'Guantes sin prueba de aire',
    open: 'Los guantes de {who} no se han probado con aire ni revisado hoy. Enrolle el puño, mire y escuche, y márquelo.',
  },
  'shock.gloves-no-protectors': {
    title: 'Faltan protectores de cuero',
    stop: 'No hay protectores de cuero sobre los guantes de {who}. Póngaselos; sin ellos no se usa el hule.',
    open: 'No se ha dicho si {who} usa protectores de cuero. Conteste en la sección 8.',
  },
  'shock.grounded-surface': {
    title: 'Metal a tierra al alcance',
    stop: '[{kind:surfaceKind}: ]hay metal a tierra al alcance, sin cubrir ni libre como pide este trabajo. Cúbralo con manta dieléctrica, o que solo lo toquen manos enguantadas y puntas donde se admite.',
    'stop/access':
      'La plataforma elevadora no es aislante y su canasta es metal a tierra al alcance. Use una aislante, o corte la energía.',
    open: 'Falta decir qué metal a tierra está al alcance. Busque retícula, ducto, unicanal y conduit, y conteste en la sección 9.',
    'open/access':
      'Falta decir si la plataforma elevadora es aislante. Lea su placa y conteste en la sección 9.',
  },
  'shock.conductive-articles': {
    title: 'Metal en el cuerpo',
    stop: 'Todavía traen anillos, reloj, cadenas o lentes de metal. Quíteselos.',
    open: 'No se ha dicho si se quitaron anillos, reloj, cadenas y lentes de metal. Revísense entre ustedes y conteste en la sección 9.',
  },
  'shock.escort-is-working': {
    title: 'Nadie libre para escoltar',
    stop: '{who} necesita escolta, y toda persona calificada tiene las manos en el trabajo. Que se quede fuera del límite limitado, o traiga a otra persona calificada.',
    caution:
      '{who} necesita escolta, y toda persona calificada está en la prueba. Que se quede fuera del límite limitado hasta comprobar la ausencia de tensión.',
  },
  'arc.study-needed': {
    title: 'Se necesita un estudio de ingeniería',
    stop: 'Aquí no aplica ningún método de arco eléctrico. Consiga un estudio o la etiqueta de este equipo, o planéelo sin energía desde aguas arriba.',
    'stop:limits-not-known':
      'No se puede saber la corriente de falla o el tiempo de liberación, así que la tabla de categorías no aplica. Consiga un estudio o la etiqueta de este equipo.',
    'stop:voltage-outside-table':
      'La tabla de categorías termina[ en {allowed:V}][; esta alimentación es de {value:V}]. Consiga un estudio de ingeniería.',
    'stop:fault-current-exceeded':
      'La corriente de falla disponible[, {value:kA},] pasa de lo que admite la tabla de categorías[, {allowed:kA}]. Consiga un estudio o la etiqueta de este equipo.',
    'stop:clearing-time-exceeded':
      'El tiempo de liberación[, {value:s},] pasa de lo que admite la tabla de categorías[, {allowed:s}]. Consiga un estudio o la etiqueta de este equipo.',
    'stop:working-distance-short':
      'La distancia de trabajo[, {value:inches},] es menor que la de la tabla de categorías[, {allowed:inches}]. Planee quedarse más lejos, o consiga un estudio.',
    'stop:label-voltage-differs':
      'La etiqueta es de otra tensión[: {value:V}, aquí {allowed:V}]. Léala otra vez; si es correcta, consiga la etiqueta o un estudio de este equipo.',
    'stop:label-working-distance':
      'La distancia de trabajo[, {value:inches},] es menor que la de la etiqueta[, {allowed:inches}]. Planee quedarse más lejos, o consiga un estudio.',
    open: 'Todavía no se puede elegir el método de arco eléctrico. Lea la etiqueta, o indique que no hay, con corriente de falla, tiempo de liberación y distancia de trabajo.',
    'open:label-not-answered':
      'Falta decir si hay etiqueta. Vea el equipo y anote lo que dice, o que no tiene.',
    'open:not-answered':
      'Falta contestar “{field}”, así que no se puede elegir el método de arco eléctrico. Anótelo en la sección 7; si no se puede saber, márquelo.',
    caution:
      'Revise la fecha de la etiqueta y qué tan cerca del límite está la corriente de falla.',
    'caution:label-review':
      'La etiqueta no tiene fecha, o es de hace más de 5 años. Pregunte si todavía vale.',
    'caution:transformer-near-limit':
      'El cálculo del transformador queda cerca del límite de la tabla[: {estimate:kA} de {limitKiloamperes:kA}]. La impedancia tiene tolerancia; consiga la cifra del estudio.',
  },
  'arc.above-forty': {
    title: 'Más de 40 cal/cm²',
    stop: 'La etiqueta dice más de 40 cal/cm²[ ({energy:cal})]. Ninguna ropa aguanta la explosión. No lo abra energizado; abra la alimentación aguas arriba.',
  },
  'arc.rating-low': {
    title: 'Clasificación de arco insuficiente',
    stop: 'La ropa[, {rating:cal},] queda abajo de lo requerido[, {required:cal}]. Todos dentro del límite de arco se cambian o se quedan fuera.',
    open: 'Falta la clasificación de arco de la ropa[; se requieren {required:cal}]. Lea la menor en las prendas.',
  },
  'arc.task-does-not-fit': {
    title: 'La tarea de arco no corresponde',
    open: 'La tarea de arco elegida[ ({task:arcFlashTask})] es más leve que el trabajo[ ({floor:arcFlashTask})]. Elija la que corresponde; mientras, cuenta la más estricta.',
  },
  'arc.bystander-inside': {
    title: 'Alguien sin protección dentro del límite de arco',
    stop: '{who} está dentro del límite de arco eléctrico sin ropa con clasificación de arco. Debe vestirla o quedarse fuera.',
    open: 'Falta decir qué tanto se acerca {who}, que no usa ropa con clasificación de arco. Conteste en la sección 10.',
  },
  'equipment.not-at-hand': {
    title: 'Equipo que no está a la mano',
    open: '{item}: no está marcado como a la mano. Tráigalo, revíselo y márquelo en la sección 8.',
  },
  'equipment.damaged': {
    title: 'Equipo dañado',
    stop: 'El equipo está dañado. No se trabaja energizado; abra el siguiente dispositivo aguas arriba.',
    open: 'No se ha dicho si hay algo dañado. Busque partes quemadas, rotas, corroídas, flojas, mojadas o desnudas y conteste en la sección 2.',
    caution:
      'El equipo está dañado, así que su condición es anormal. Abra el siguiente dispositivo aguas arriba.',
  },
  'surroundings.ladder-conductive': {
    title: 'Escalera conductora',
    stop: 'La escalera conduce[ ({material:ladderMaterial})]. Use una de fibra de vidrio.',
    open: 'Falta decir de qué es la escalera. Vea los largueros y conteste en la sección 9.',
  },
  'surroundings.ladder-top': {
    title: 'Parado muy arriba en la escalera',
    stop: 'El peldaño[, a {standingLevelFeet:feet},] queda muy arriba en esta escalera[; a lo más {limit:feet}]. Párese más abajo o use una más alta.',
    open: 'Falta el tamaño de la escalera. Léalo en la escalera y anótelo en la sección 9.',
    'open/standingLevelFeet': 'Falta la altura del peldaño donde se para. Anótela en la sección 9.',
  },
  'surroundings.ladder-short': {
    title: 'Escalera corta o mal puesta',
    stop: 'La escalera es corta para este techo[; se necesita de {smallestFeet:feet}]. Use una más alta, una plataforma o un elevador.',
    'stop/placed':
      'La escalera no está abierta y trabada, a nivel y lejos de puertas y paso. Colóquela bien antes de que alguien suba.',
    open: 'Falta el tamaño de la escalera. Léalo en la escalera y anótelo en la sección 9.',
    'open/ceilingHeightFeet': 'Falta la altura del techo. Mídala y anótela en la sección 9.',
    'open/placed':
      'No se ha dicho si la escalera está trabada, a nivel y lejos de puertas y paso. Revísela y conteste en la sección 9.',
  },
  'surroundings.dark': {
    title: 'Luz insuficiente',
    stop: 'Con el circuito apagado no hay luz suficiente. Ponga luces de batería o temporales antes de meter las manos.',
    open: 'No se ha dicho si hay luz suficiente con el circuito apagado. Júzguelo así y conteste en la sección 9.',
  },
  'surroundings.wet': {
    title: 'Mojado',
    stop: 'Hay algo mojado. Pare hasta que equipo, apoyo, manos y ropa estén secos; si es sin energía, escriba qué se hace.',
    open: 'No se ha dicho si hay algo mojado. Vea el equipo, el piso y la escalera, y conteste en la sección 9.',
    caution:
      'Hay algo mojado y las medidas están escritas. Cúmplalas: apoyo seco, guantes secos, GFCI en cada extensión.',
  },
  'surroundings.barricade': {
    title: 'Barricada',
    stop: 'La barricada[, a {inches:inches},] está más cerca de lo debido[: {requiredInches:least}]. Aléjela, haya vigía o no.',
    open: 'Puede acercarse gente y no hay barricada a la distancia debida[ ({requiredInches:least})] ni vigía que lo impida. Ponga una y anótela en la sección 9.',
  },
  'surroundings.egress-dark': {
    title: 'Alumbrado de emergencia fuera de servicio',
    open: 'El alumbrado de emergencia se apaga con gente en el edificio. Avise a quien lo administra y ponga lo que lo suple; anote los dos en la sección 3.',
    'open/toldTo':
      'El alumbrado de emergencia se apaga y no se indica a quién del edificio se avisó. Avise y anote a quién en la sección 3.',
    'open/interim':
      'El alumbrado de emergencia se apaga y no se indica qué lo suple. Ponga luces, rondas a pie o saque a la gente; anótelo en la sección 3.',
    caution:
      'El alumbrado de emergencia queda fuera de servicio hasta restablecerlo y probarlo. Mantenga hasta entonces lo que lo suple.',
  },
  'surroundings.lift-unsafe': {
    title: 'Plataforma elevadora con falta',
    stop: 'En la plataforma alguien no lleva arnés amarrado. Amárrese antes de que suba.',
    'stop/operatorTrained':
      'El operador de la plataforma no está capacitado. Ponga a quien sí lo esté.',
    open: 'No se ha dicho si en la plataforma se usa arnés amarrado. Conteste en la sección 9.',
    'open/operatorTrained':
      'No se ha dicho si el operador de la plataforma está capacitado. Conteste en la sección 9.',
  },
  'surroundings.overhead-line': {
    title: 'Línea aérea cercana',
    stop: 'Hay una línea aérea a menos de 10 ft. Quédese a 10 ft con todo extendido, o que la compañía suministradora la atienda.',
    open: 'Falta decir qué tan cerca hay líneas aéreas. Mire hacia arriba y conteste en la sección 9.',
    'open/outdoors': 'No se ha dicho si el trabajo es a la intemperie. Conteste en la sección 9.',
  },
  'surroundings.ceiling-content': {
    title: 'Asbesto o bifenilos (PCB)',
    stop: 'Se sospecha asbesto o bifenilos. No mueva el techo ni el balastro; que los analicen primero.',
    open: 'Falta decir si el techo o el balastro puede tener asbesto o bifenilos. Pregunte a quien administra el edificio y conteste en la sección 9.',
  },
  'crew.lead-unqualified': {
    title: 'El encargado no está calificado',
    stop: 'El encargado[, {who},] no es persona calificada. Nombre a quien sí lo es.',
    open: 'No hay exactamente un encargado. Nombre a un solo encargado calificado en la sección 10.',
    'open/qualified':
      'Falta decir si el encargado[, {who},] está calificado. Conteste en la sección 10.',
    'open/qualifiedThrough':
      'Falta hasta cuándo está calificado el encargado[, {who}]. Anote la fecha en la sección 10.',
  },
  'crew.training-lapsed': {
    title: 'Capacitación vencida',
    stop: 'La capacitación de {who} ya venció[ ({qualifiedThrough})]. No cuenta como persona calificada hasta renovarla.',
    open: 'Falta hasta cuándo está calificada esta persona: {who}. Anote la fecha en la sección 10.',
  },
  'crew.alone': {
    title: 'Una persona sola',
    stop: 'Una persona sola no hace trabajo energizado. Traiga a otra.',
    caution:
      'Hay una persona sola. Avise a alguien dónde está y hasta qué hora, y que le llame a horas fijas.',
  },
  'crew.briefing-open': {
    title: 'Falta un tema de la plática',
    open: 'Falta en la plática: {topic}. Háblelo con todos y márquelo.',
  },
  'crew.emergency-plan': {
    title: 'Plan de emergencia',
    open: '{field}: no está indicado. Anótelo en la sección 10.',
  },
  'crew.rescue-untrained': {
    title: 'Nadie sabe rescatar',
    open: 'Nadie que quede libre para ayudar sabe liberar del contacto, dar RCP y usar el DEA. Traiga a quien sepa, o marque quién sabe.',
  },
  'window.too-long': {
    title: 'Más de 12 horas',
    stop: 'El trabajo está planeado para más de 12 horas[ ({minutes:minutes})]. Divídalo en hojas de 12 horas o menos.',
  },
  'window.reversed': {
    title: 'Termina antes de empezar',
    stop: 'El término planeado no es después del inicio. Corrija las horas en la sección 1.',
  },
  'window.over': {
    title: 'Ya pasó el término planeado',
    stop: 'Ya pasó el término planeado. Ciérrela o planee otra hora.',
  },
  'window.shift-change': {
    title: 'Cambio de turno',
    open: 'El trabajo pasa a otro turno y no se indica quién recibe los candados y vuelve a medir. Anótelo en la sección 1.',
    'open/crossesShift':
      'No se ha dicho si el trabajo pasa a otro turno. Conteste en la sección 1.',
  },
  'lamp.line-voltage-lampholder': {
    title: 'Portalámparas con tensión de línea',
    caution:
      'Los portalámparas de tubos de dos extremos pueden tener tensión de línea o varios cientos de volts, y un tubo equivocado puede dar choque o reventar. Lea el marcado; corte la energía también para lámparas.',
  },
  'job.construction': {
    title: 'Aplican reglas de construcción',
    caution:
      'La obra nueva y la remodelación son construcción (29 CFR 1926): etiquete el circuito sin energía en cada punto donde se pueda energizar. Los planes estatales y códigos locales pueden pedir más.',
  },
  'closeout.not-cleared': {
    title: 'No está libre para restablecer',
    stop: '{field} No. Retire herramientas, avise a todos y vea que todos estén lejos, en ese orden, antes de que vuelva la energía.',
    open: '{field} Sin respuesta. Revíselo y conteste antes de que vuelva la energía.',
  },
  'closeout.locks-left': {
    title: 'Quedan candados',
    open: 'Falta decir si se restableció o queda con candado. Vea el dispositivo y los candados, y conteste.',
    'open/locksRemoved':
      'El circuito se restableció y no todos los candados están marcados como quitados. Cada quien quita el suyo; luego márquelo.',
    caution: 'Queda con candado. Anote quién tiene los candados.',
  },
  'closeout.covers-off': {
    title: 'Faltan tapas',
    stop: 'Hay tapas fuera con el circuito energizado. Póngalas primero; orientar o probar sin tapas es trabajo energizado y necesita una hoja de ese tipo.',
    open: 'Falta decir si todas las tapas están puestas. Véalas una por una y conteste.',
  },
  'closeout.egress-untested': {
    title: 'Alumbrado de emergencia sin probar',
    open: 'Las luces de emergencia no se han probado después del trabajo. Pruébelas y anótelo.',
    'open/egressTestedSeconds':
      'Las luces de emergencia no se han probado con batería después del trabajo[, o solo {seconds:s}]. Déjelas al menos 30 s y anote el tiempo.',
    'open/egressLit':
      'Las luces de emergencia no se han visto encendidas en su propio circuito después del trabajo. Véalas y márquelo.',
  },
  unanswered: {
    title: 'Sin respuesta',
    open: '[{where}: ]falta contestar “{field}”. Conteste en la sección {section}.',
  },
};
