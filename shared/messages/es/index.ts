import type { en } from '../en/index';
import type { Words } from '../words';
import { account } from './account';
import { archive } from './archive';
import { board } from './board';
import { caution } from './caution';
import { citations } from './citations';
import { closeOut } from './closeOut';
import { common } from './common';
import { drawing } from './drawing';
import { enumerations } from './enumerations';
import { fields } from './fields';
import { findings } from './findings';
import { helper } from './helper';
import { hints } from './hints';
import { home } from './home';
import { insights } from './insights';
import { items } from './items';
import { mail } from './mail';
import { pdf } from './pdf';
import { permit } from './permit';
import { photos } from './photos';
import { problems } from './problems';
import { proof } from './proof';
import { register } from './register';
import { signing } from './signing';
import { stop } from './stop';
import { topics } from './topics';
import { trail } from './trail';
import { ui } from './ui';
import { verify } from './verify';
import { worksheet } from './worksheet';

/** Every word that people read, in the Spanish of a Mexican electrician. */
export const es: Words<typeof en> = {
  account,
  archive,
  board,
  caution,
  citations,
  closeOut,
  common,
  drawing,
  enumerations,
  fields,
  findings,
  helper,
  hints,
  home,
  insights,
  items,
  mail,
  pdf,
  permit,
  photos,
  problems,
  proof,
  register,
  signing,
  stop,
  topics,
  trail,
  ui,
  verify,
  worksheet,
};
