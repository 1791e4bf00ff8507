import type { verify as en } from '../en/verify';
import type { Words } from '../words';

export const verify: Words<typeof en> = {
  title: 'Comprobar un papel',
  lead: 'Cada hoja impresa lleva un número y un código de 64 caracteres. Escriba los dos como están en el papel.',
  number: 'Número de la hoja de trabajo',
  numberHint: 'Por ejemplo 2026-000123',
  code: 'Código en el papel, SHA-256',
  codeHint: '64 caracteres. Los espacios y los renglones no cuentan.',
  check: 'Comprobar',
  checking: 'Comprobando el papel',
  another: 'Comprobar otro papel',
  notANumber: 'Escriba el número como año, guion, cifras: 2026-000123.',
  codeLength: (count) => `${count} de 64 caracteres. Lea otra vez el código en el papel.`,
  codeLetters: 'En el código solo hay de 0 a 9 y de a a f. Léalo otra vez en el papel.',
  checkedAt: (number, at) => `${number}, comprobado ${at}`,
  matches: {
    title: 'Este es el registro',
    body: 'Este número y este código se firmaron juntos. Las palabras en papel se pueden alterar: cuando importe, pida a la empresa su propia copia.',
    compare: 'Compara los 64 caracteres y la revisión con su papel.',
  },
  superseded: {
    title: 'Reemplazado',
    body: 'Esto se firmó, y una revisión posterior lo reemplazó. No trabaje con este papel. Pida al encargado el que está en vigor.',
    compare: 'Compara los 64 caracteres con su papel.',
    state: 'Reemplazado',
  },
  not: {
    title: 'Este no es el registro',
    body: 'Ninguna firma aquí lleva este número y este código juntos. El papel se cambió, o nunca se firmó aquí.',
    compare:
      'Lea otra vez el código en el papel. Si es el mismo, guarde el papel y llame a la oficina de seguridad de la empresa.',
  },
  worksheet: 'Hoja de trabajo',
  revision: 'Revisión',
  state: 'Estado',
  signed: 'Firmado',
  foot: 'Se muestra a quien tenga el papel: sin nombres, sin lugar, sin contenido. Dice qué se firmó, no que algo esté libre de peligro. Decide una persona calificada.',
  tooMany: 'Demasiadas comprobaciones desde aquí. Espere un minuto y compruebe otra vez.',
};
