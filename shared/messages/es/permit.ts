import type { permit as en } from '../en/permit';
import type { Words } from '../words';

/** Si se requiere permiso de trabajo energizado, por qué, o qué lo exime. */
export const permit: Words<typeof en> = {
  required: 'Se requiere permiso de trabajo energizado.',
  notRequired: 'No se requiere permiso de trabajo energizado.',
  because: {
    'absence test':
      'La prueba de ausencia de tensión es trabajo energizado hasta que marca cero. No necesita permiso; los límites y el EPP sí aplican.',
    testing:
      'La medición por una persona calificada no necesita permiso; los límites y el EPP sí aplican.',
    'inspection outside restricted':
      'Inspeccionar con las tapas puestas y nadie dentro del límite restringido no necesita permiso; el EPP sí aplica.',
    'inside restricted': 'Alguien está o puede estar dentro del límite restringido.',
    'arc flash likely': 'Es probable un arco eléctrico.',
    'below 50 V': 'Todo lo que se trabaja o queda expuesto está abajo de 50 V.',
    'nobody inside': 'Nadie entra al límite restringido y el arco eléctrico no es probable.',
  },
  exemption: {
    '130.2(C)(1)': 'Exento por ser medición, búsqueda de fallas o lectura de tensión.',
    '130.2(C)(2)': 'Exento por ser termografía o inspección visual fuera del límite restringido.',
  },
  stillProtected: 'Estar exento del permiso nunca exime del equipo de protección.',
};
