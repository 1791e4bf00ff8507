import type { mail as en } from '../en/mail';
import type { Words } from '../words';

export const mail: Words<typeof en> = {
  greeting: (name) => `${name}:`,
  foot: 'Wideberth manda este correo por sí solo. Nadie lee las respuestas.',
  invitation: {
    subject: 'Su cuenta en Wideberth',
    body: (link) =>
      `Su oficina de seguridad le abrió una cuenta. Elija aquí su contraseña y su PIN de firma:\n\n${link}\n\nEl enlace sirve una sola vez, dentro de una hora. Después pida otro a su oficina de seguridad.`,
  },
  reset: {
    subject: 'Elija una contraseña nueva',
    body: (link) =>
      `Alguien pidió una contraseña nueva para esta cuenta. Elíjala aquí:\n\n${link}\n\nEl enlace sirve una sola vez, dentro de una hora. Si no fue usted, no haga nada: la contraseña sigue igual.`,
  },
  passwordChanged: {
    subject: 'Su contraseña cambió',
    body: 'La contraseña de su cuenta cambió y se cerraron todas sus demás sesiones. Si no fue usted, avise de inmediato a su oficina de seguridad.',
  },
  pinChanged: {
    subject: 'Su PIN de firma cambió',
    body: 'El PIN de firma de su cuenta cambió y sus dispositivos ya no firman sin señal hasta que los agregue otra vez. Si no fue usted, avise de inmediato a su oficina de seguridad.',
  },
  pinBlocked: {
    subject: 'Su PIN de firma se escribió mal cinco veces',
    body: 'Su PIN se escribió mal cinco veces y no firma durante 15 minutos. Si no fue usted, alguien intentó firmar en su nombre: avise de inmediato a su oficina de seguridad.',
  },
  worksheet: {
    'awaits-acknowledgement': {
      subject: (number) => `${number} espera su enterado`,
      body: 'Usted está en la cuadrilla. Lea qué puede hacerle daño ahí; después dé su enterado o pregunte.',
    },
    'awaits-countersignature': {
      subject: (number) => `${number} espera una contrafirma`,
      body: 'La cuadrilla ya firmó. Lea las excepciones; después contrafirme o regrésela con un motivo.',
    },
    'in-force': {
      subject: (number) => `${number} está vigente`,
      body: 'Ya está contrafirmada. Trate todo como energizado hasta comprobar que no hay tensión.',
    },
    'acknowledged-for-you': {
      subject: (number) => `${number}: se dio el enterado en su nombre`,
      body: 'Su PIN se escribió en el dispositivo de otra persona de la cuadrilla. Si no fue usted, avise de inmediato a su oficina de seguridad.',
    },
    returned: {
      subject: (number) => `${number} fue regresada`,
      body: 'Corríjala y firme de nuevo.',
    },
    stopped: {
      subject: (number) => `${number} fue detenida`,
      body: 'El trabajo está detenido. Sigue solo con una revisión nueva y firmas nuevas.',
    },
    expired: {
      subject: (number) => `${number} venció`,
      body: 'Pasó el final previsto y no se cerró. Ciérrela, o haga una revisión antes de seguir con el trabajo.',
    },
    asked: {
      subject: (number) => `Una pregunta sobre ${number}`,
      body: 'Alguien de la cuadrilla preguntó algo. No se contrafirma hasta que usted conteste.',
    },
    answered: {
      subject: (number) => `Su pregunta sobre ${number} tiene respuesta`,
      body: 'Lea la respuesta antes de firmar.',
    },
  },
  reason: (reason) => `Motivo: ${reason}`,
  seal: {
    subject: (date) => `El registro quedó sellado, ${date}`,
    body: (count, hash) =>
      `El sello de esta noche cubre ${count} eventos. Guarde este correo: su sello demuestra después que ninguno cambió.\n\nSello: ${hash}`,
  },
};
