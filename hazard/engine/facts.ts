import type { Edition } from '../editions/types';
import { answeredTaskFacts } from '../tasks';
import type { JobTaskFacts } from '../tasks';
import type { Permit, RequiredItem, Stage } from '../types';
import { readAnswers } from './answers';
import type { Answers } from './answers';
import { arcOf } from './arc';
import type { ArcFacts } from './arc';
import { distancesOf } from './boundaries';
import type { Distances } from './boundaries';
import { requiredItemsOf } from './items';
import { laterDate } from './moment';
import type { Moment } from './moment';
import { isBelowFiftyVolts, pathOfAnswers } from './path';
import type { Path } from './path';
import { peopleOf } from './people';
import type { People, Person } from './people';
import { permitOf } from './permit';
import { readingsOf } from './readings';
import type { Readings } from './readings';
import { readCloseOut, readProof } from './recordAnswers';
import type { CloseOutAnswers, ProofAnswers } from './recordAnswers';
import { readSources } from './sources';
import type { Source } from './sources';
import { voltageOf } from './voltage';
import type { Voltage } from './voltage';

/** All that the rules read: the answers, and what follows from them, worked out once. */
export interface Facts {
  readonly edition: Edition;
  readonly stage: Stage;
  readonly on: Moment;
  /** The day on which gloves, training and a label's review are judged. */
  readonly day: string;
  readonly answers: Answers;
  readonly proof: ProofAnswers;
  readonly closeOut: CloseOutAnswers;
  readonly path: Path;
  readonly task: JobTaskFacts;
  readonly isBelowFiftyVolts: boolean;
  readonly sources: readonly Source[];
  readonly people: People;
  readonly voltage: Voltage;
  readonly arc: ArcFacts;
  readonly distances: Distances;
  readonly permit: Permit;
  readonly items: readonly RequiredItem[];
  /** This equipment is emergency lighting, or nothing says that it is not. */
  readonly isEmergencyLighting: boolean;
  /** Someone is, or may be, inside the limited or the arc flash boundary. */
  readonly isSomeoneInside: boolean;
  /** The neutral is clamped before it is parted. */
  readonly asksNeutralCurrent: boolean;
  /** The readings of the proof; worked out only where a rule asks. */
  readonly readings: Readings;
}

interface Question {
  content: unknown;
  proof: unknown;
  closeOut: unknown;
  on: Moment;
  stage: Stage;
  edition: Edition;
}

/** How near a person is, as far as it was answered. */
export function isInsideArcFlashBoundary(
  { nearest }: Person,
  arc: ArcFacts,
  { limited }: Distances,
): boolean | undefined {
  if (nearest === undefined) return undefined;
  if (nearest === 'outside all boundaries') return false;
  if (nearest !== 'outside limited') return true;
  const { arcFlashBoundary } = arc.result;
  if (!arc.likely) return false;
  if (arcFlashBoundary === null || limited === null) return undefined;
  return arcFlashBoundary.inches > limited.inches;
}

function egressReachesThis({ egressSupply, egressReaches }: Answers): boolean {
  return (
    egressReaches !== 'other equipment only, checked' &&
    egressSupply.values.some((supply) => supply !== 'none after checking' && supply !== 'unknown')
  );
}

/** Reads a worksheet once, and works out what every rule needs of it. */
export function factsOf({ content, proof, closeOut, on, stage, edition }: Question): Facts {
  const answers = readAnswers(content);
  const recorded = readProof(proof);
  const { endsAt, task: name } = answers.job;
  const day = endsAt === undefined ? on.date : laterDate(on.date, endsAt.date);
  const task = answeredTaskFacts(name);
  const path = pathOfAnswers(answers);
  const belowFifty = isBelowFiftyVolts(answers, path);
  const sources = readSources(answers);
  const basic = { answers, task, path, day, sources, isBelowFiftyVolts: belowFifty };
  const people = peopleOf(basic);
  const voltage = voltageOf(basic, edition);
  const arc = arcOf({ ...basic, people, voltage }, edition);
  const distances = distancesOf({ answers, voltage, arc }, edition);
  const insides = people.crew.map((person) => isInsideArcFlashBoundary(person, arc, distances));

  let readings: Readings | undefined;
  const facts = {
    ...basic,
    edition,
    stage,
    on,
    proof: recorded,
    closeOut: readCloseOut(closeOut),
    people,
    voltage,
    arc,
    distances,
    permit: permitOf({ ...basic, people, arc }, edition),
    isEmergencyLighting: egressReachesThis(answers),
    isSomeoneInside:
      !belowFifty && (people.someoneEnters || insides.some((inside) => inside !== false)),
    asksNeutralCurrent: path === 'off' && voltage.isPhaseToNeutral && task.kind === 'repair',
    get readings() {
      readings ??= readingsOf({ answers, proof: recorded, sources, voltage, on });
      return readings;
    },
    items: [] as readonly RequiredItem[],
  };
  facts.items = requiredItemsOf(facts);
  return facts;
}
