import type { Rule } from '../engine/rule';
import { alternativeIsImpossible } from './alternativeIsImpossible';
import { arcFlashIsWithinTable } from './arcFlashIsWithinTable';
import { arcFlashTaskFits } from './arcFlashTaskFits';
import { batteryIsParted } from './batteryIsParted';
import { belowFiftyVoltsIsSo } from './belowFiftyVoltsIsSo';
import { briefingCoversTopics } from './briefingCoversTopics';
import { bystandersAreArcRated } from './bystandersAreArcRated';
import { ceilingContentIsKnown } from './ceilingContentIsKnown';
import { circuitVoltageIsOfSystem } from './circuitVoltageIsOfSystem';
import { clothingIsRated } from './clothingIsRated';
import { conductiveArticlesAreOff } from './conductiveArticlesAreOff';
import { conductorColorsFitSystem } from './conductorColorsFitSystem';
import { constructionIsPointedOut } from './constructionIsPointedOut';
import { contactInstrumentIsUsed } from './contactInstrumentIsUsed';
import { controlsAreListed } from './controlsAreListed';
import { controlsAreOperated } from './controlsAreOperated';
import { coversAreOn } from './coversAreOn';
import { directCurrentIsRead } from './directCurrentIsRead';
import { egressIsTested } from './egressIsTested';
import { egressStaysLit } from './egressStaysLit';
import { egressSupplyIsKnown } from './egressSupplyIsKnown';
import { egressSupplyIsListed } from './egressSupplyIsListed';
import { emergencyPlanIsWritten } from './emergencyPlanIsWritten';
import { energizedWorkHasReason } from './energizedWorkHasReason';
import { energizedWorkIsExplained } from './energizedWorkIsExplained';
import { entrantHasGloves } from './entrantHasGloves';
import { equipmentIsUndamaged } from './equipmentIsUndamaged';
import { escortHasFreeHands } from './escortHasFreeHands';
import { everyPairIsRead } from './everyPairIsRead';
import { everySourceIsConfirmedOpen } from './everySourceIsConfirmedOpen';
import { everyoneLocks } from './everyoneLocks';
import { glovesAreAirTested } from './glovesAreAirTested';
import { glovesAreInTest } from './glovesAreInTest';
import { glovesAreOfClass } from './glovesAreOfClass';
import { glovesHaveProtectors } from './glovesHaveProtectors';
import { groundedSurfacesAreCovered } from './groundedSurfacesAreCovered';
import { highLegIsPointedOut } from './highLegIsPointedOut';
import { infeasibilityIsAdmitted } from './infeasibilityIsAdmitted';
import { instrumentIsProved } from './instrumentIsProved';
import { itemsAreAtHand } from './itemsAreAtHand';
import { jobIsWithinScope } from './jobIsWithinScope';
import { labelIsNotAboveForty } from './labelIsNotAboveForty';
import { ladderDoesNotConduct } from './ladderDoesNotConduct';
import { ladderIsTallEnough } from './ladderIsTallEnough';
import { ladderTopIsNotStoodOn } from './ladderTopIsNotStoodOn';
import { lampholdersArePointedOut } from './lampholdersArePointedOut';
import { leadIsQualified } from './leadIsQualified';
import { leadsAreInspected } from './leadsAreInspected';
import { liftProtects } from './liftProtects';
import { locksAreHandedOver } from './locksAreHandedOver';
import { locksAreRemoved } from './locksAreRemoved';
import { meterIsOfItsPlace } from './meterIsOfItsPlace';
import { neighborsAreGuarded } from './neighborsAreGuarded';
import { neutralCurrentIsChecked } from './neutralCurrentIsChecked';
import { noStrayVoltageIsLeft } from './noStrayVoltageIsLeft';
import { noVoltageIsRead } from './noVoltageIsRead';
import { nobodyWorksAlone } from './nobodyWorksAlone';
import { openedOnLoadSideOfTransfer } from './openedOnLoadSideOfTransfer';
import { overheadLinesAreFar } from './overheadLinesAreFar';
import { ownConductorsAreRead } from './ownConductorsAreRead';
import { peopleAreKeptAway } from './peopleAreKeptAway';
import { permitIsGiven } from './permitIsGiven';
import { placeIsCleared } from './placeIsCleared';
import { placeIsDry } from './placeIsDry';
import { qualifiedPersonLocksAndTests } from './qualifiedPersonLocksAndTests';
import { readingsFitSystem } from './readingsFitSystem';
import { rescuerIsTrained } from './rescuerIsTrained';
import { sharedNeutralIsOpened } from './sharedNeutralIsOpened';
import { sourceIsLocked } from './sourceIsLocked';
import { sourceIsOpened } from './sourceIsOpened';
import { sourcesAreListed } from './sourcesAreListed';
import { storedEnergyIsDischarged } from './storedEnergyIsDischarged';
import { switchIsNoIsolation } from './switchIsNoIsolation';
import { testingIsNotRepair } from './testingIsNotRepair';
import { trainingIsCurrent } from './trainingIsCurrent';
import { transferStartsOnOpening } from './transferStartsOnOpening';
import { travelersAreListed } from './travelersAreListed';
import { trippedCauseIsFound } from './trippedCauseIsFound';
import { unqualifiedStayOutside } from './unqualifiedStayOutside';
import { windowIsNotOver } from './windowIsNotOver';
import { windowIsShort } from './windowIsShort';
import { windowRunsForward } from './windowRunsForward';
import { workIsLit } from './workIsLit';

/** Every rule, in the order in which findings are shown. One rule, one file. */
export const rules: readonly Rule[] = Object.freeze([
  jobIsWithinScope,
  circuitVoltageIsOfSystem,
  readingsFitSystem,
  highLegIsPointedOut,
  conductorColorsFitSystem,
  trippedCauseIsFound,
  sourcesAreListed,
  egressSupplyIsKnown,
  egressSupplyIsListed,
  switchIsNoIsolation,
  sourceIsOpened,
  sourceIsLocked,
  batteryIsParted,
  qualifiedPersonLocksAndTests,
  travelersAreListed,
  sharedNeutralIsOpened,
  openedOnLoadSideOfTransfer,
  transferStartsOnOpening,
  neutralCurrentIsChecked,
  neighborsAreGuarded,
  controlsAreListed,
  storedEnergyIsDischarged,
  everyoneLocks,
  energizedWorkHasReason,
  energizedWorkIsExplained,
  belowFiftyVoltsIsSo,
  testingIsNotRepair,
  infeasibilityIsAdmitted,
  alternativeIsImpossible,
  permitIsGiven,
  everySourceIsConfirmedOpen,
  contactInstrumentIsUsed,
  meterIsOfItsPlace,
  instrumentIsProved,
  everyPairIsRead,
  noVoltageIsRead,
  noStrayVoltageIsLeft,
  controlsAreOperated,
  ownConductorsAreRead,
  directCurrentIsRead,
  leadsAreInspected,
  unqualifiedStayOutside,
  entrantHasGloves,
  glovesAreOfClass,
  glovesAreInTest,
  glovesAreAirTested,
  glovesHaveProtectors,
  groundedSurfacesAreCovered,
  conductiveArticlesAreOff,
  escortHasFreeHands,
  arcFlashIsWithinTable,
  labelIsNotAboveForty,
  clothingIsRated,
  arcFlashTaskFits,
  bystandersAreArcRated,
  itemsAreAtHand,
  equipmentIsUndamaged,
  ladderDoesNotConduct,
  ladderTopIsNotStoodOn,
  ladderIsTallEnough,
  workIsLit,
  placeIsDry,
  peopleAreKeptAway,
  egressStaysLit,
  liftProtects,
  overheadLinesAreFar,
  ceilingContentIsKnown,
  leadIsQualified,
  trainingIsCurrent,
  nobodyWorksAlone,
  briefingCoversTopics,
  emergencyPlanIsWritten,
  rescuerIsTrained,
  windowIsShort,
  windowRunsForward,
  windowIsNotOver,
  locksAreHandedOver,
  lampholdersArePointedOut,
  constructionIsPointedOut,
  placeIsCleared,
  locksAreRemoved,
  coversAreOn,
  egressIsTested,
]);
