import { StyleSheet, View } from 'react-native';
import {
  CONDUCTOR_COLORS,
  NEUTRAL_SHARED,
  SWITCHINGS,
  SYSTEMS,
  TRIPPED,
  circuitVoltsOf,
  identifySystem,
  pathOf,
} from '@/hazard';
import { amperes, list, volts } from '@/shared/format';
import { useLocale } from '../../i18n/preferences';
import { useMessages } from '../../i18n/useMessages';
import { space } from '../../theme/tokens';
import { Text } from '../../ui';
import {
  FieldChoice,
  FieldMulti,
  FieldNumber,
  FieldSelect,
  FieldText,
  FieldYesNo,
} from '../form/fields';
import { wordOf } from '../form/fieldWords';
import { useWorksheetForm } from '../form/WorksheetFormContext';
import { SectionFrame } from '../parts/SectionFrame';
import {
  CircuitSuggestions,
  PanelSuggestions,
  SystemSuggestions,
} from '../parts/SupplySuggestions';

const AT_SERVICE = new Set(['panelboard', 'switchboard', 'disconnect', 'transformer']);

/** What the meter says about the system; never chosen for the person. */
function ReadingsSay() {
  const words = useMessages();
  const locale = useLocale();
  const { content } = useWorksheetForm();
  const readings = content.supply?.readings;
  const given = {
    phaseToPhase: readings?.phaseToPhase ?? [],
    phaseToNeutral: readings?.phaseToNeutral ?? [],
  };
  if (given.phaseToPhase.length + given.phaseToNeutral.length === 0) return null;
  const fits = identifySystem(given).map((system) => wordOf(words, 'system', system));
  return (
    <Text variant="answer" aria-live="polite">
      {fits.length === 0
        ? words.worksheet.readingsFitNothing
        : words.worksheet.readingsFit(list(locale, fits, 'disjunction'))}
    </Text>
  );
}

function ExpectedLoad() {
  const words = useMessages();
  const locale = useLocale();
  const { assessment } = useWorksheetForm();
  const load = assessment.expected.loadAmperes;
  if (load === null) return null;
  return <Text variant="answer">{words.worksheet.expectedLoad(amperes(locale, load))}</Text>;
}

function SupplySummary() {
  const words = useMessages();
  const locale = useLocale();
  const { content } = useWorksheetForm();
  const supply = content.supply ?? {};
  return (
    <>
      {supply.system !== undefined && (
        <Text variant="answer">
          {words.worksheet.systemAndCircuit(
            wordOf(words, 'system', supply.system),
            supply.circuitVolts === undefined ? undefined : volts(locale, supply.circuitVolts),
          )}
        </Text>
      )}
      {supply.panel !== undefined && (
        <Text variant="answer">
          {words.worksheet.panelAndCircuit(supply.panel, supply.circuit)}
        </Text>
      )}
      <ReadingsSay />
      <ExpectedLoad />
    </>
  );
}

function Readings() {
  const words = useMessages();
  return (
    <>
      {(['phaseToPhase', 'phaseToNeutral'] as const).map((kind) => (
        <View key={kind} style={styles.readings}>
          {[0, 1, 2].map((index) => (
            <View key={index} style={styles.reading}>
              <FieldNumber
                name={`supply.readings.${kind}.${index}`}
                label={words.worksheet.readingLabel[kind][index] ?? ''}
                hint=""
                unit="V"
              />
            </View>
          ))}
        </View>
      ))}
    </>
  );
}

/** 2. What feeds it: the system, the voltage, the circuit, and what the meter says of them. */
export function SupplySection() {
  const locale = useLocale();
  const { content } = useWorksheetForm();
  const supply = content.supply ?? {};
  const path = pathOf(content);
  const phaseToNeutral = supply.circuitVolts === 120 || supply.circuitVolts === 277;
  const lowVolts =
    content.decision?.reason === 'below 50 V' || content.job?.task === 'work on lighting control';
  return (
    <SectionFrame section="supply" folded={<SupplySummary />}>
      <FieldSelect name="supply.system" values={SYSTEMS} group="system" />
      <SystemSuggestions />
      {supply.system !== undefined && (
        <FieldChoice
          name="supply.circuitVolts"
          values={circuitVoltsOf(supply.system)}
          wordFor={(value) => volts(locale, value)}
        />
      )}
      <FieldText name="supply.panel" exact />
      <PanelSuggestions />
      <FieldText name="supply.circuit" exact />
      <CircuitSuggestions />
      {AT_SERVICE.has(content.arcFlash?.equipment ?? '') && <FieldYesNo name="supply.atService" />}
      <FieldMulti name="supply.switching" values={SWITCHINGS} group="switching" alone={['none']} />
      {phaseToNeutral ? (
        <FieldChoice name="supply.neutralShared" values={NEUTRAL_SHARED} group="neutralShared" />
      ) : (
        <FieldYesNo name="supply.neutralPresent" />
      )}
      <FieldSelect name="supply.tripped" values={TRIPPED} group="tripped" />
      <FieldYesNo name="supply.damage" />
      <Readings />
      <ReadingsSay />
      <FieldNumber name="supply.watts" unit="W" />
      <ExpectedLoad />
      <FieldMulti name="supply.conductorColors" values={CONDUCTOR_COLORS} group="conductorColor" />
      {(lowVolts || path === 'energized') && (
        <>
          <FieldNumber name="supply.workVolts" unit="V" />
          <FieldYesNo name="supply.higherVoltsExposed" />
        </>
      )}
    </SectionFrame>
  );
}

const styles = StyleSheet.create({
  readings: { flexDirection: 'row', gap: space.xs },
  reading: { flex: 1, minWidth: 0 },
});
