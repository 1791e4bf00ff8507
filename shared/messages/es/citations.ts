import type { citations as en } from '../en/citations';
import type { Words } from '../words';

/** Palabras dentro de una cita. Los números y nombres de normas quedan como están impresos. */
export const citations: Words<typeof en> = {
  ownRule: 'Regla de esta herramienta',
};

/**
 * Las palabras en inglés dentro de una cita y las nuestras; las más largas primero,
 * para que una corta no parta a una larga.
 */
export const citationParts: readonly { from: string; to: string }[] = [
  { from: 'above 240 V to 600 V', to: 'más de 240 V a 600 V' },
  {
    from: 'Effects of electric current in the human body',
    to: 'Efectos de la corriente en el cuerpo',
  },
  {
    from: 'Battery connector under exclusive control',
    to: 'Conector de batería bajo control exclusivo',
  },
  { from: 'Wall switches and control devices', to: 'Apagadores y dispositivos de control' },
  { from: 'Transformer nameplate arithmetic', to: 'Cálculo con la placa del transformador' },
  { from: 'Supplies of emergency lighting', to: 'Alimentación del alumbrado de emergencia' },
  { from: 'Nominal voltages of a system', to: 'Tensiones nominales de un sistema' },
  { from: 'switchgear and switchboards', to: 'tableros de distribución' },
  { from: 'Test of emergency lighting', to: 'Prueba del alumbrado de emergencia' },
  { from: 'Leather protectors always', to: 'Protectores de cuero siempre' },
  { from: 'Measurement categories', to: 'Categorías de medición' },
  { from: 'review every 5 years', to: 'revisión cada 5 años' },
  { from: 'Length of a worksheet', to: 'Duración de una hoja' },
  { from: 'Who approves a permit', to: 'Quién firma un permiso' },
  { from: 'motor control centers', to: 'centros de control de motores' },
  { from: 'Who opens and locks', to: 'Quién abre y bloquea' },
  { from: 'other 600 V class', to: 'otros, clase 600 V' },
  { from: 'Conductor colors', to: 'Colores de conductores' },
  { from: 'Double-ended lamps', to: 'Lámparas de dos extremos' },
  { from: 'Grounded surfaces', to: 'Superficies a tierra' },
  { from: 'Lighting controls', to: 'Controles de alumbrado' },
  { from: 'Outage asked for', to: 'Corte solicitado' },
  { from: 'Ladder placement', to: 'Colocación de la escalera' },
  { from: 'Stepladder reach', to: 'Alcance con escalera de tijera' },
  { from: 'Above 40 cal/cm²', to: 'Más de 40 cal/cm²' },
  { from: 'Shared neutrals', to: 'Neutros compartidos' },
  { from: 'Direct current', to: 'Corriente directa' },
  { from: 'Working alone', to: 'Trabajar solo' },
  { from: 'Who may escort', to: 'Quién puede escoltar' },
  { from: 'Stray voltage', to: 'Tensión residual' },
  { from: 'Battery units', to: 'Unidades de batería' },
  { from: 'Infinite bus', to: 'Barra infinita' },
  { from: 'Load current', to: 'Corriente de carga' },
  { from: 'panelboards', to: 'tableros' },
  { from: 'UL notices', to: 'Avisos de UL' },
  { from: 'Travelers', to: 'Puentes de tres vías' },
  { from: 'Exception', to: 'Excepción' },
  { from: 'Article', to: 'Artículo' },
  { from: 'range B', to: 'intervalo B' },
  { from: 'Scope', to: 'Alcance' },
  { from: 'Table', to: 'Tabla' },
  { from: 'Note', to: 'Nota' },
  { from: ' to 240', to: ' hasta 240' },
];
