/** Mails. `link` is always of this installation; nothing in a mail can be answered or signed. */
export const mail = {
  greeting: (name: string) => `${name},`,
  foot: 'Wideberth sends this mail on its own. Nobody reads an answer to it.',
  invitation: {
    subject: 'Your account in Wideberth',
    body: (link: string) =>
      `Your safety office has made an account for you. Choose your password and your signing PIN here:\n\n${link}\n\nThe link works once, within an hour. After that ask your safety office for another.`,
  },
  reset: {
    subject: 'Choose a new password',
    body: (link: string) =>
      `Somebody asked for a new password for this account. Choose it here:\n\n${link}\n\nThe link works once, within an hour. If it was not you, do nothing: the password stays as it is.`,
  },
  passwordChanged: {
    subject: 'Your password was changed',
    body: 'The password of your account was changed, and every other sign-in has ended. If it was not you, tell your safety office at once.',
  },
  pinChanged: {
    subject: 'Your signing PIN was changed',
    body: 'The signing PIN of your account was changed, and your devices can no longer sign without signal until you add them again. If it was not you, tell your safety office at once.',
  },
  pinBlocked: {
    subject: 'Your signing PIN was entered wrong five times',
    body: 'Your PIN was entered wrong five times and does not sign for 15 minutes. If it was not you, somebody tried to sign in your name: tell your safety office at once.',
  },
  worksheet: {
    'awaits-acknowledgement': {
      subject: (number: string) => `${number} waits for you to acknowledge it`,
      body: 'You are named on the crew. Read what can hurt you there, then acknowledge it or ask.',
    },
    'awaits-countersignature': {
      subject: (number: string) => `${number} waits for a countersignature`,
      body: 'The crew has signed. Read the exceptions, then countersign or send it back with a reason.',
    },
    'in-force': {
      subject: (number: string) => `${number} is in force`,
      body: 'It is countersigned. Treat everything as live until it is proved dead.',
    },
    'acknowledged-for-you': {
      subject: (number: string) => `${number} was acknowledged in your name`,
      body: "Your PIN was entered on another crew member's device. If it was not you, tell your safety office at once.",
    },
    returned: {
      subject: (number: string) => `${number} was sent back`,
      body: 'Revise it, then sign again.',
    },
    stopped: {
      subject: (number: string) => `${number} was stopped`,
      body: 'The work is stopped. It goes on only with a new revision and new signatures.',
    },
    expired: {
      subject: (number: string) => `${number} has expired`,
      body: 'The planned end has passed and it was not closed. Close it out, or revise it before the work goes on.',
    },
    asked: {
      subject: (number: string) => `A question on ${number}`,
      body: 'A crew member asked something. It is not countersigned before you answer.',
    },
    answered: {
      subject: (number: string) => `Your question on ${number} is answered`,
      body: 'Read the answer before you sign.',
    },
  },
  reason: (reason: string) => `Reason: ${reason}`,
  seal: {
    subject: (date: string) => `The record is sealed, ${date}`,
    body: (count: number, hash: string) =>
      `The seal of this night covers ${count} events. Keep this mail: its seal proves later that none of them was changed.\n\nSeal: ${hash}`,
  },
};
