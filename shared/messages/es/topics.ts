import type { topics as en } from '../en/topics';
import type { Words } from '../words';

/** Los temas de la plática previa y qué decir en cada uno. */
export const topics: Words<typeof en> = {
  'job and tasks': {
    name: 'Trabajo y tareas',
    say: 'Qué se hace, dónde, quién y en qué orden.',
  },
  'electrical hazards': {
    name: 'Peligros eléctricos',
    say: 'La tensión de aquí, cada fuente que lo energiza y qué hace un choque así.',
  },
  'shock boundaries and protection': {
    name: 'Límites de choque y protección',
    say: 'El límite limitado y el restringido en pies, y los guantes.',
  },
  'arc flash boundary and protection': {
    name: 'Límite de arco y protección',
    say: 'Dónde queda y qué se usa adentro.',
  },
  'work procedures': {
    name: 'Procedimiento de trabajo',
    say: 'Abrir, bloquear, probar, medir, comprobar; luego las manos. Sin otro orden.',
  },
  'special precautions': {
    name: 'Precauciones especiales',
    say: 'Escalera, metal a tierra, agua, oscuridad, material del techo, rociadores y alarmas.',
  },
  'energy source controls': {
    name: 'Control de cada fuente',
    say: 'Dónde se abre cada una, de quién son los candados y quién los quita.',
  },
  'protective equipment': {
    name: 'Equipo de protección',
    say: 'Quién usa qué, revisado y con prueba vigente.',
  },
  'who may come how close': {
    name: 'Quién se acerca y cuánto',
    say: 'Uno por uno, hasta comprobar la ausencia de tensión.',
  },
  'emergency plan': {
    name: 'Plan de emergencia',
    say: 'Quién llama, quién abre el circuito, quién da RCP y dónde está el DEA.',
  },
  'stopping and refusing': {
    name: 'Parar y negarse',
    say: 'Cualquiera puede parar o decir no. Nadie puede reprochárselo.',
  },
  permit: { name: 'Permiso', say: 'Qué permite el permiso de trabajo energizado y hasta cuándo.' },
};
