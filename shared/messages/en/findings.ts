/**
 * The words of every finding of `assess`, by its code. One sentence a severity:
 * what is so, then what to do. `{name}` is filled from the finding; a part in
 * square brackets is left out where its figure is not known.
 */
export const findings = {
  'job.outside-scope': {
    title: 'Outside what this sheet covers',
    stop: '[{special}: ]this sheet does not cover it. Do not plan this work here; take it to the people and the procedure that do.',
    open: 'Not said whether anything outside this sheet is present. Look for it and answer in section 1.',
  },
  'supply.voltage-not-of-system': {
    title: 'Circuit voltage does not fit the system',
    stop: '[{volts:V} ]is no circuit voltage of this system[ ({system})]. Correct the system or the voltage; 120 V beside 480Y/277 V comes from a transformer and is a system of its own.',
    open: 'The circuit voltage is not answered. Read it off the panel and answer in section 2.',
    'open/system': 'The system is not answered. Read it off the panel and answer in section 2.',
  },
  'supply.readings-do-not-fit': {
    title: 'Readings do not fit the system',
    stop: 'The voltages read do not fit the declared system[ ({system})][. They fit {fits:system}]. Find out which supply this is, then correct section 2.',
    open: 'Voltages were read, but no system is named. Name the system in section 2.',
  },
  'supply.high-leg': {
    title: 'High leg present',
    caution:
      'One phase of this supply reads about 208 V to neutral. Find the orange conductor, keep lighting circuits off it, and test every phase.',
  },
  'supply.colors-do-not-fit': {
    title: 'Conductor color of another system',
    caution:
      '[{color:conductorColor} ]is the custom of another system than the one declared. Read the voltage; color proves nothing.',
  },
  'supply.tripped': {
    title: 'Breaker tripped',
    stop: 'The breaker tripped and the cause is not found. Do not reclose it; find and repair the fault first.',
    open: 'Not said whether the breaker has tripped. Look at it and ask, then answer in section 2.',
    caution:
      'The breaker tripped and the cause is not found. Look for the fault with the circuit open; do not reclose to try.',
  },
  'sources.none': {
    title: 'No way it can be live is listed',
    open: 'No way it can be live is listed. Add each one in section 3, the normal branch circuit first.',
  },
  'sources.egress-unknown': {
    title: 'Emergency egress supply not known',
    stop: 'Nobody knows where the emergency egress supply comes from. Find it before anything is opened: charge lamps, emergency panels, the building’s drawings.',
    open: 'None after checking stands beside a supply. Look again, then keep one of the two in section 3.',
    'open:unanswered':
      'Where the emergency egress supply comes from is not answered. Look for charge lamps and emergency panels, then answer in section 3.',
  },
  'sources.egress-not-listed': {
    title: 'Emergency supply is not listed',
    stop: 'The emergency supply[ ({supply:egressSupply})] reaches this equipment and is not listed. Add it in section 3, with where it is opened.',
    open: 'The emergency supply[ ({supply:egressSupply})] reaches this equipment and the list of ways is not complete. Add it, and name the kind of each way, in section 3.',
  },
  'sources.switch-only': {
    title: 'A switch or control is not an opening',
    stop: '{way} is opened only at a switch or control device[ ({openedAt})]. Taped or not it never counts as open. Open the breaker or a disconnect, and lock it.',
  },
  'sources.not-opened': {
    title: 'A way stays closed',
    stop: '{way} is not opened. Open it at a breaker, disconnect, fuse or plug, then mark it in section 3.',
    open: '{way}: where it is opened is not answered. Choose it in section 3.',
  },
  'sources.not-locked': {
    title: 'Opening not locked as required',
    stop: '{way} is not held open as it must be[ (now: {held})]. Hang a lock and a tag. A tag alone needs a second measure; a lock alone serves one device within one shift; holding it in hand serves a plug or battery connector only.',
    open: '{way}: how it is held open is not answered. Hang a lock and a tag, then enter it in section 3.',
    'open/openedAt':
      '{way} is in the hands of the person who works, and where it is opened is not answered. Choose it in section 3.',
    'open/lockNumber':
      '{way}: the number of its lock is not entered. Read it off the lock and enter it in section 3.',
  },
  'sources.battery-connected': {
    title: 'Battery unit still connected',
    stop: '{way} is still connected. Its output may be at line voltage with every breaker off. Part the connector in the luminaire, then mark it here; if it cannot be parted, this sheet cannot go on.',
    open: 'A battery unit is to be replaced and none is listed. Add it in section 3 and part its connector.',
    'open/openedAt':
      '{way}: not marked as parted. Part the connector in the luminaire, then mark it in section 3.',
  },
  'sources.by-unqualified': {
    title: 'Locking or testing by someone not qualified',
    stop: '{who} locks or tests[ {way}] and is not a qualified person of this crew. Give it to one who is.',
    open: 'Whether {who}, who locks or tests[ {way}], is a qualified person is not answered. Answer it in section 10.',
    'open:unanswered':
      'Not said who opens and locks, or who tests[: {way}]. Name a qualified person of this crew.',
  },
  'sources.traveler-unlisted': {
    title: 'Traveler not listed',
    open: 'There are switches in two or more places, and no traveler is listed. Walk to each switch, then add the traveler in section 3.',
    'open:unanswered':
      'How it is switched is not answered, so a traveler may be missing. Walk the area, then answer in section 2.',
  },
  'sources.shared-neutral': {
    title: 'Shared neutral',
    stop: '{way}: not every phase that shares the neutral is opened. Open and lock all of them; a parted neutral can stand at line voltage.',
    open: 'The neutral is shared and no shared neutral is listed. Add it in section 3, with all its phases.',
    'open/allPhasesOpened':
      '{way}: not said whether every phase that shares the neutral is opened. Trace them, then answer in section 3.',
  },
  'sources.opened-before-transfer': {
    title: 'Opened ahead of the transfer switch',
    stop: '{way} is opened ahead of the transfer switch: the standby supply makes the circuit live again within seconds. Open the branch breaker on the load side.',
    open: '{way}: not said on which side of the transfer switch it is opened. Trace it, then answer in section 3.',
  },
  'sources.transfer-starts': {
    title: 'Standby supply will start',
    caution:
      'Opening the normal supply makes the standby supply start. Lights still on after the breaker is off are expected, and no sign of a wrong breaker.',
  },
  'sources.neutral-not-checked': {
    title: 'Current in the neutral',
    stop: '[{amperes:A} ]flows in the neutral: another circuit shares it. Do not part it; find and open the other circuit, then clamp again.',
    open: 'The neutral is or may be shared and no clamp reading is entered. Clamp it before it is parted, and enter the amperes.',
  },
  'sources.live-neighbor': {
    title: 'Live parts beside the work',
    stop: 'The same box or panel keeps live parts that are not guarded. Cover them with rated insulation or open them too.',
    open: 'Not said whether the same box or panel keeps live parts. Look; with only the panel’s own main open, its line lugs are live. Then answer with the proof.',
  },
  'sources.control-unlisted': {
    title: 'Control wiring not listed',
    open: 'The switching is automatic or not known, and no control wiring is listed. Find what feeds the sensor, relay or dimming pair, and add it in section 3.',
    'open:unanswered':
      'How it is switched is not answered, so control wiring may be missing. Answer it in section 2.',
  },
  'sources.stored-energy': {
    title: 'Stored energy',
    open: 'Stored energy is not discharged. Wait, discharge and measure the driver, ballast or battery output, then enter it with the proof.',
    'open:unanswered':
      'Stored energy is not answered. Measure the driver, ballast or battery output, discharge it, then enter it with the proof.',
  },
  'sources.not-everyone-locked': {
    title: 'Not everyone has a lock on it',
    open: '{way}: not everyone who works on the circuit has a lock on it[ (missing: {names})]. Each hangs their own, on the device or the group lock box.',
  },
  'decision.unjustified': {
    title: 'Energized without an admitted reason',
    stop: 'Energized work is planned and no admitted reason is given[ for this task ({task})]. Switch it off, or give a reason that the regulation admits.',
    open: 'Energized work is planned, and which reasons are admitted follows from the task. Choose the task in section 1.',
  },
  'decision.explanation-missing': {
    title: 'Explanation missing',
    open: 'Why it stays energized is not explained. Write it in section 4, in your own words.',
  },
  'decision.below-fifty-not-so': {
    title: 'Not everything is below 50 V',
    stop: '50 V or more is worked on or exposed[ ({volts:V})]. Below 50 V is then no reason; switch it off.',
    open: 'Below 50 V is the reason, and the highest voltage worked on is not answered. Enter it in section 2.',
    'open/higherVoltsExposed':
      'Below 50 V is the reason, and not said whether anything higher is exposed. Look, then answer in section 2.',
  },
  'decision.testing-is-not-repair': {
    title: 'Testing is no reason to repair live',
    stop: 'Testing admits no repair[ ({task})]. Test, then switch off for the repair.',
  },
  'decision.infeasible-not-admitted': {
    title: 'Ground not admitted',
    stop: 'This ground does not make it infeasible to switch off. Convenience, tenants, lost sales and overtime are not admitted, and testing is no ground for a repair. Plan the outage.',
    open: 'Why it cannot be done with the power off is not answered. Choose it in section 4.',
    'open/task':
      'Testing is the ground, and the task is not answered. Choose the task in section 1.',
    caution:
      'A continuous industrial process is given as the ground. A building’s lighting is hardly ever part of one. Have the supervisor look at it.',
  },
  'decision.alternative-possible': {
    title: 'Another way is possible',
    stop: 'Temporary light is possible, so darkness is no reason. Set up the light and switch off.',
    open: 'Another way is not ruled out yet. Answer it in section 4.',
    'open/outageRefusedBy':
      'Nobody who runs the building is named as having refused the outage. Ask them, then enter who refused.',
    'open/hazard':
      'Which greater hazard switching off would bring is not answered. Choose it in section 4.',
    'open/temporaryLight':
      'Whether temporary light is possible is not answered. Look, then answer in section 4.',
  },
  'permit.missing': {
    title: 'Energized work permit',
    stop: 'The permit does not hold for this work. Get one that does.',
    'stop/approvedBy':
      'The permit is signed by someone of the crew[, {who}]. Get it signed by someone who is not.',
    'stop/validUntil':
      'The permit ends before the work does. Get one that lasts, or end the work earlier.',
    open: 'An energized work permit is required. Enter its number, who signed it, and until when it holds.',
    'open/number':
      'An energized work permit is required, and its number is not entered. Get the permit, then enter its number.',
    'open/approvedBy':
      'An energized work permit is required, and who signed it is not entered. Enter their name.',
    'open/validUntil':
      'An energized work permit is required, and until when it holds is not entered. Enter the date and time.',
  },
  'absence.source-not-opened': {
    title: 'Opening not confirmed',
    stop: '{way} is not confirmed as opened, held and tried. Go to it, try it, then confirm it before the test.',
    open: 'Which ways were opened, held and tried is not answered. Confirm each one before the test.',
  },
  'absence.proximity-tester': {
    title: 'Proximity tester',
    stop: 'A proximity tester never proves absence of voltage. Use a contact tester.',
    open: 'The instrument is not chosen. Choose the contact tester in section 5.',
  },
  'absence.meter-category': {
    title: 'Meter not rated for this',
    stop: 'The tester is not rated for this place. Use one that is, leads included.',
    'stop/category':
      'The tester[, {category},] is not rated for this place. Fixed wiring needs CAT III or IV, a service CAT IV, leads included.',
    'stop/ratedVolts':
      'The tester is rated[ {ratedVolts:V},] below the supply here[, {volts:V} phase to phase]. Use one rated for it, leads included.',
    open: 'Category or rated voltage of the tester is not answered. Read both off the meter and the leads, and enter the lowest.',
    'open/atService':
      'Not said whether this is at the service, where a meter needs CAT IV. Answer it in section 2.',
  },
  'absence.not-proved': {
    title: 'Tester not proved before and after',
    open: 'The tester is not proved on a known live source before and after the test. Prove it, then mark both.',
    'open/provedBefore':
      'The tester is not proved on a known live source before the test. Prove it, then test and mark it.',
    'open/provedAfter':
      'The tester is not proved on a known live source after the test. Prove it again, then mark it; if it fails, the readings count for nothing.',
  },
  'absence.pairs-missing': {
    title: 'Readings missing',
    open: '{point}: readings are missing[ ({pairs})]. Test every pair at every point of work, and enter each reading.',
    'open/pointsOfWork':
      'How many points of work there are is not answered, so no test can be complete. Count them and answer in section 1.',
  },
  'absence.voltage-present': {
    title: 'Voltage present',
    stop: '{point}: {volts:reading} is present[, {pair}]. It is live. Step back, stop the work, and find the way that is missing.',
  },
  'absence.stray-voltage': {
    title: 'Stray voltage',
    stop: '{point}: {volts:reading} remains[, {pair}]. Find where it comes from, or test again with a low-impedance meter.',
  },
  'absence.controls-not-operated': {
    title: 'Controls not operated',
    stop: 'Not every control was put ON for the test. 0 V behind an open switch proves nothing. Put each one ON, each three-way in both positions, and test again.',
    open: 'Not said whether every control was put ON. Operate each one, each three-way in both positions, before and during the test.',
  },
  'absence.source-not-tested': {
    title: 'A way was not tested',
    open: '{way}: its conductors are not read[ at {point}][ to {to:conductor}]. Read each to ground and to each phase at every point that it reaches.',
  },
  'absence.dc-not-tested': {
    title: 'DC not tested',
    open: '{way}: no DC reading[ at {point}]. An AC range does not see a battery or a driver output. Switch to DC and read them.',
  },
  'absence.leads-not-inspected': {
    title: 'Leads not inspected',
    open: 'Instrument, leads and probes are not marked as inspected. Look them over and check the category on the leads, then mark it.',
  },
  'shock.unqualified-inside': {
    title: 'Someone not qualified comes too close',
    stop: '{who} is not qualified and comes too close[: {closest}]. Keep them outside the limited boundary, or give them a qualified escort where limited admits one.',
    open: '{who} comes close[: {closest}], and whether they are qualified is not answered. Answer it in section 10.',
    'open:unanswered': 'How close {who} comes is not answered. Answer it in section 10.',
  },
  'shock.gloves-missing': {
    title: 'Rubber gloves missing',
    stop: '{who} enters the restricted boundary and has no rubber gloves. Pick a pair from the register for them.',
    open: '{who} enters the restricted boundary, and no gloves are answered. Pick a pair in section 8.',
  },
  'shock.gloves-class': {
    title: 'Glove class too low',
    stop: 'The gloves of {who}[, class {class},] are not enough[ for {volts:V}]. Take a pair of a higher class; section 8 names it.',
    open: 'The class of the gloves of {who} is not answered. Read it off the cuff.',
  },
  'shock.gloves-overdue': {
    title: 'Gloves out of test',
    stop: 'The gloves of {who} are out of test[ since {dueOn}]. Leave them and take a pair that is in test.',
    open: 'When the gloves of {who} were last tested is not answered. Read the stamp and enter the date.',
  },
  'shock.gloves-not-air-tested': {
    title: 'Gloves not air-tested',
    open: 'The gloves of {who} are not air-tested and inspected today. Roll the cuff, look and listen, then mark it.',
  },
  'shock.gloves-no-protectors': {
    title: 'Leather protectors missing',
    stop: 'No leather protectors over the gloves of {who}. Put them on; without them the rubber is not worn.',
    open: 'Not said whether {who} wears leather protectors. Answer it in section 8.',
  },
  'shock.grounded-surface': {
    title: 'Grounded metal in reach',
    stop: '[{kind:surfaceKind}: ]grounded metal is in reach and neither covered nor kept clear as this work asks. Cover it with a rubber blanket, or keep everything but gloved hands and probes off it where that is admitted.',
    'stop/access':
      'The lift does not insulate, and its basket is grounded metal in reach. Use an insulating lift, or switch off.',
    open: 'Grounded metal in reach is not answered. Look for the ceiling grid, duct, strut and conduit, then answer in section 9.',
    'open/access':
      'Whether the lift insulates is not answered. Read its plate, then answer in section 9.',
  },
  'shock.conductive-articles': {
    title: 'Metal on the body',
    stop: 'Rings, watch, chains or metal frames are still worn. Take them off.',
    open: 'Not said whether rings, watch, chains and metal frames are off. Look at each other, then answer in section 9.',
  },
  'shock.escort-is-working': {
    title: 'Nobody free to escort',
    stop: '{who} needs an escort, and every qualified person has hands in the work. Keep them outside the limited boundary, or bring one more qualified person.',
    caution:
      '{who} needs an escort, and every qualified person is at the test. Keep them outside the limited boundary until it is proved dead.',
  },
  'arc.study-needed': {
    title: 'Engineering study needed',
    stop: 'No arc flash method holds here. Get an engineering study or a label of this equipment, or plan it with the power off upstream.',
    'stop:limits-not-known':
      'Fault current or clearing time cannot be found out, so the category table does not hold. Get an engineering study or a label of this equipment.',
    'stop:voltage-outside-table':
      'The category table ends[ at {allowed:V}][; this supply is {value:V}]. Get an engineering study.',
    'stop:fault-current-exceeded':
      'The available fault current[, {value:kA},] is more than the category table admits[, {allowed:kA}]. Get an engineering study or a label of this equipment.',
    'stop:clearing-time-exceeded':
      'The clearing time[, {value:s},] is longer than the category table admits[, {allowed:s}]. Get an engineering study or a label of this equipment.',
    'stop:working-distance-short':
      'The working distance[, {value:inches},] is shorter than the category table admits[, {allowed:inches}]. Plan to stay farther off, or get an engineering study.',
    'stop:label-voltage-differs':
      'The label is for another voltage[: {value:V}, here {allowed:V}]. Read it again; if it is right, get a label or a study of this equipment.',
    'stop:label-working-distance':
      'The working distance[, {value:inches},] is shorter than the label’s[, {allowed:inches}]. Plan to stay farther off, or get an engineering study.',
    open: 'The arc flash method cannot be chosen yet. Read the label, or enter that there is none, with fault current, clearing time and working distance.',
    'open:label-not-answered':
      'Label or no label is not answered. Look at the equipment and enter what its label says, or that there is none.',
    'open:not-answered':
      '“{field}” is not answered, so the arc flash method cannot be chosen. Enter it in section 7; if it cannot be found out, mark that.',
    caution: 'Check the date of the label, and how near the fault current is to the limit.',
    'caution:label-review':
      'The label bears no date, or one of more than 5 years ago. Ask whether it still holds.',
    'caution:transformer-near-limit':
      'The transformer estimate is near the limit of the table[: {estimate:kA} of {limitKiloamperes:kA}]. Impedance has a tolerance; get the study’s figure.',
  },
  'arc.above-forty': {
    title: 'More than 40 cal/cm²',
    stop: 'The label says more than 40 cal/cm²[ ({energy:cal})]. No clothing answers the blast. Do not open it energized; open the supply upstream.',
  },
  'arc.rating-low': {
    title: 'Arc rating too low',
    stop: 'The clothing[, {rating:cal},] is rated below what is required[, {required:cal}]. Everyone inside the arc flash boundary changes, or stays out.',
    open: 'The arc rating worn is not answered[; {required:cal} is required]. Read the lowest one off the garments.',
  },
  'arc.task-does-not-fit': {
    title: 'Arc flash task does not fit the job',
    open: 'The arc flash task chosen[ ({task:arcFlashTask})] is milder than the job[ ({floor:arcFlashTask})]. Choose the one that fits; until then the stricter counts.',
  },
  'arc.bystander-inside': {
    title: 'Inside the arc flash boundary unprotected',
    stop: '{who} is inside the arc flash boundary without arc-rated clothing. Dress them for it, or keep them outside.',
    open: 'How close {who} comes is not answered, and they wear no arc-rated clothing. Answer it in section 10.',
  },
  'equipment.not-at-hand': {
    title: 'Equipment not at hand',
    open: '{item}: not marked as at hand. Bring it and look it over, then mark it in section 8.',
  },
  'equipment.damaged': {
    title: 'Equipment damaged',
    stop: 'The equipment is damaged. It is not worked on energized; open the next device upstream.',
    open: 'Not said whether anything is damaged. Look for scorched, cracked, corroded, loose, wet or bare parts, then answer in section 2.',
    caution:
      'The equipment is damaged, so its condition is abnormal. Open the next device upstream.',
  },
  'surroundings.ladder-conductive': {
    title: 'Conductive ladder',
    stop: 'The ladder conducts[ ({material:ladderMaterial})]. Take a fiberglass one.',
    open: 'What the ladder is made of is not answered. Look at the rails, then answer in section 9.',
  },
  'surroundings.ladder-top': {
    title: 'Standing too high on the ladder',
    stop: 'The step stood on[, {standingLevelFeet:feet},] is too high on this ladder[; highest {limit:feet}]. Stand lower, or take a taller ladder.',
    open: 'Ladder size is not answered. Read it off the ladder and enter it in section 9.',
    'open/standingLevelFeet':
      'The height of the step stood on is not answered. Enter it in section 9.',
  },
  'surroundings.ladder-short': {
    title: 'Ladder too short or not placed',
    stop: 'The ladder is too short for this ceiling[; {smallestFeet:feet} needed]. Take a taller one, a platform or a lift.',
    'stop/placed':
      'The ladder is not locked open, level and kept from doors and traffic. Set it right before anyone climbs.',
    open: 'Ladder size is not answered. Read it off the ladder and enter it in section 9.',
    'open/ceilingHeightFeet':
      'Ceiling height is not answered. Measure it and enter it in section 9.',
    'open/placed':
      'Not said whether the ladder is locked open, level and kept from doors and traffic. Check it, then answer in section 9.',
  },
  'surroundings.dark': {
    title: 'Not enough light',
    stop: 'With the circuit off there is not enough light. Set up battery or temporary lights before anyone reaches in.',
    open: 'Not said whether there is enough light with the circuit off. Judge it that way, then answer in section 9.',
  },
  'surroundings.wet': {
    title: 'Wet',
    stop: 'Something is wet. Stop until equipment, stand, hands and clothing are dry; on the off path write what is done about it.',
    open: 'Not said whether anything is wet. Look at the equipment, the floor and the ladder, then answer in section 9.',
    caution:
      'Something is wet, and measures are written. Keep to them: dry stand, dry gloves, GFCI on every cord.',
  },
  'surroundings.barricade': {
    title: 'Barricade',
    stop: 'The barricade[, at {inches:inches},] is nearer than it must be[: {requiredInches:least}]. Move it out, attendant or not.',
    open: 'People may approach, and no barricade far enough out[ ({requiredInches:least})] nor attendant keeps them off. Set one and enter it in section 9.',
  },
  'surroundings.egress-dark': {
    title: 'Emergency lighting out of service',
    open: 'Emergency lighting goes out while people are in the building. Tell whoever runs it and set up what stands in; enter both in section 3.',
    'open/toldTo':
      'Emergency lighting goes out, and nobody who runs the building is named as told. Tell them, then enter who in section 3.',
    'open/interim':
      'Emergency lighting goes out, and nothing is named that stands in for it. Set up lights, a walking watch, or send people out; enter it in section 3.',
    caution:
      'Emergency lighting is out of service until it is restored and tested. Keep what stands in for it running until then.',
  },
  'surroundings.lift-unsafe': {
    title: 'Lift not in order',
    stop: 'On the lift someone wears no fall protection. Tie off before it rises.',
    'stop/operatorTrained': 'The operator of the lift is not trained for it. Put one there who is.',
    open: 'Not said whether fall protection is worn and tied off on the lift. Answer it in section 9.',
    'open/operatorTrained':
      'Not said whether the operator of the lift is trained. Answer it in section 9.',
  },
  'surroundings.overhead-line': {
    title: 'Overhead line near',
    stop: 'An overhead line is nearer than 10 ft. Stay 10 ft away with everything at its longest, or have the utility deal with the line.',
    open: 'How near overhead lines are is not answered. Look up, then answer in section 9.',
    'open/outdoors': 'Not said whether the work is outdoors. Answer it in section 9.',
  },
  'surroundings.ceiling-content': {
    title: 'Asbestos or PCBs',
    stop: 'Asbestos or PCBs are suspected. Do not disturb the ceiling or the ballast; have it tested first.',
    open: 'Whether the ceiling or ballast may hold asbestos or PCBs is not answered. Ask whoever runs the building, then answer in section 9.',
  },
  'crew.lead-unqualified': {
    title: 'Lead is not qualified',
    stop: 'The lead[, {who},] is not a qualified person. Name one who is.',
    open: 'Not exactly one person leads. Name one qualified lead in section 10.',
    'open/qualified':
      'Whether the lead[, {who},] is qualified is not answered. Answer it in section 10.',
    'open/qualifiedThrough':
      'Until when the lead[, {who},] is qualified is not answered. Enter the date in section 10.',
  },
  'crew.training-lapsed': {
    title: 'Training lapsed',
    stop: 'The training of {who} has lapsed[ ({qualifiedThrough})]. They count as not qualified until it is renewed.',
    open: 'Until when {who} is qualified is not answered. Enter the date in section 10.',
  },
  'crew.alone': {
    title: 'One person alone',
    stop: 'One person alone may not do energized work. Bring a second.',
    caution:
      'One person is alone. Let somebody know where and until when, and have them call at set times.',
  },
  'crew.briefing-open': {
    title: 'Briefing topic left',
    open: 'Not yet covered in the briefing: {topic}. Talk it through with everyone, then mark it.',
  },
  'crew.emergency-plan': {
    title: 'Emergency plan',
    open: '{field}: not named. Write it in section 10.',
  },
  'crew.rescue-untrained': {
    title: 'Nobody trained in rescue',
    open: 'Nobody who stays free to help is trained in release from contact, CPR and AED. Bring someone who is, or mark who is.',
  },
  'window.too-long': {
    title: 'More than 12 hours',
    stop: 'The work is planned for more than 12 hours[ ({minutes:minutes})]. Split it into worksheets of 12 hours or less.',
  },
  'window.reversed': {
    title: 'Ends before it starts',
    stop: 'The planned end is not after the start. Correct the times in section 1.',
  },
  'window.over': {
    title: 'Planned end has passed',
    stop: 'The planned end has passed. Close it or plan a new time.',
  },
  'window.shift-change': {
    title: 'Shift change',
    open: 'The work runs into another shift, and who takes over the locks and tests again is not named. Write it in section 1.',
    'open/crossesShift':
      'Not said whether the work runs into another shift. Answer it in section 1.',
  },
  'lamp.line-voltage-lampholder': {
    title: 'Lampholder at line voltage',
    caution:
      'Lampholders of double-ended tubes may be at line voltage or several hundred volts, and a wrong tube may shock or burst. Read the marking; power off for lamps too.',
  },
  'job.construction': {
    title: 'Construction rules apply',
    caution:
      'New and renovation work is construction (29 CFR 1926): tag the deenergized circuit at every point where it can be energized. State plans and local codes may ask more.',
  },
  'closeout.not-cleared': {
    title: 'Not clear to restore',
    stop: '{field} No. Clear the tools, warn everybody, see that everybody is clear, in this order, before any power returns.',
    open: '{field} Not answered. Check it and answer before any power returns.',
  },
  'closeout.locks-left': {
    title: 'Locks left',
    open: 'Restored or left locked is not answered. Look at the device and the locks, then answer.',
    'open/locksRemoved':
      'The circuit is restored, and not every lock is marked as off. Each lock comes off by its owner; then mark it.',
    caution: 'It stays locked. Write in the notes who holds the locks.',
  },
  'closeout.covers-off': {
    title: 'Covers off',
    stop: 'Covers are off with the circuit energized. Put them on first; aiming or proving with covers off is energized work and needs a sheet of that kind.',
    open: 'Whether all covers are back on is not answered. Look at each one, then answer.',
  },
  'closeout.egress-untested': {
    title: 'Emergency lighting not tested',
    open: 'The emergency lights are not tested after the work. Test them, then enter it.',
    'open/egressTestedSeconds':
      'The emergency lights are not run on battery after the work[, or only {seconds:s}]. Run them for at least 30 s and enter the time.',
    'open/egressLit':
      'The emergency lights are not seen lit on their own branch after the work. Look at them there, then mark it.',
  },
  unanswered: {
    title: 'Not answered',
    open: '[{where}: ]“{field}” is not answered. Answer it in section {section}.',
  },
};
