import type { items as en } from '../en/items';
import type { Words } from '../words';

/** El nombre de cada equipo requerido. */
export const items: Words<typeof en> = {
  'rubber-insulating-gloves': 'Guantes dieléctricos[, clase {class} o mejor]',
  'leather-protectors': 'Protectores de cuero sobre los guantes',
  'insulated-tools': 'Herramienta aislada',
  'insulated-probes': 'Puntas de prueba aisladas',
  'safety-glasses': 'Lentes de protección',
  'nonconductive-hard-hat': 'Casco no conductor',
  'nonmelting-clothing': 'Ropa que no se derrite, también la interior',
  'arc-rated-shirt-and-trousers':
    'Camisa y pantalón, u overol, con clasificación de arco[, {rating:cal} o más]',
  'hearing-protection': 'Protección auditiva, tapones',
  'leather-footwear': 'Calzado de cuero',
  'arc-rated-face-shield-or-hood':
    'Careta o capucha con clasificación de arco[, {rating:cal} o más]',
  'arc-rated-balaclava-or-hood':
    'Pasamontañas o capucha con clasificación de arco[, {rating:cal} o más]',
  'arc-flash-suit-hood': 'Traje con capucha para arco eléctrico[, {rating:cal} o más]',
  'arc-rated-gloves':
    'Guantes con clasificación de arco, o dieléctricos con protectores[, {rating:cal} o más]',
  'contact-tester': 'Probador de contacto con cables[, {category}][, {volts:V} o más][, {current}]',
  'known-source': 'Fuente viva conocida para verificar el probador[, {current}]',
  'clamp-ammeter': 'Amperímetro de gancho para el neutro',
  'lock-and-tag': 'Candado y etiqueta, uno de cada uno por persona que trabaja',
  'written-lockout-procedure': 'Procedimiento de bloqueo por escrito, a la mano',
  'insulating-covers': 'Manta o cubierta dieléctrica para metal a tierra',
  'nonconductive-ladder': 'Escalera no conductora',
  'barricade-and-signs': 'Barricada y letreros',
  'work-light': 'Lámpara de trabajo con batería',
};
