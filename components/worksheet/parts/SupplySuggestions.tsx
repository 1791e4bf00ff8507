import { SYSTEMS, type SystemCode } from '@/hazard';
import { useMessages } from '../../i18n/useMessages';
import { wordOf } from '../form/fieldWords';
import { useSetField } from '../form/useSetField';
import { useWorksheetForm } from '../form/WorksheetFormContext';
import { useLastHere } from '../lastHere';
import { Suggestions } from './Suggestions';

/** More than this and a row of buttons is longer than typing the number. */
const MOST_CIRCUITS = 12;

const isSame = (one: string | undefined, other: string | undefined) =>
  one?.trim().toLowerCase() === other?.trim().toLowerCase();

/** The panel of the register that the typed name names. */
function useKnownPanel() {
  const { content, site } = useWorksheetForm();
  return site?.panels.find(({ name }) => isSame(name, content.supply?.panel));
}

/** The system that the register gives the panel, else those of the site, else the last one here. Readings confirm it. */
export function SystemSuggestions() {
  const words = useMessages();
  const { content, site } = useWorksheetForm();
  const panel = useKnownPanel();
  const last = useLastHere();
  const take = useSetField('supply.system');
  if (content.supply?.system !== undefined) return null;
  const fromSite: readonly SystemCode[] =
    panel?.system !== undefined ? [panel.system] : (site?.systems ?? []);
  const before = last?.content.supply?.system;
  const offer = fromSite.length > 0 ? fromSite : before === undefined ? [] : [before];
  const wordFor = (system: SystemCode) => wordOf(words, 'system', system);
  return (
    <Suggestions
      from={fromSite.length > 0 ? words.worksheet.fromSite : (last?.from ?? '')}
      values={offer.map(wordFor)}
      onTake={(word) => take(SYSTEMS.find((system) => wordFor(system) === word))}
    />
  );
}

/** Panels of the register; without any, the panel of the last worksheet here. */
export function PanelSuggestions() {
  const words = useMessages();
  const { content, site } = useWorksheetForm();
  const last = useLastHere();
  const take = useSetField('supply.panel');
  const typed = content.supply?.panel;
  const names = (site?.panels ?? []).map(({ name }) => name);
  const before = last?.content.supply?.panel;
  const offersBefore = before !== undefined && !isSame(before, typed);
  return (
    <>
      {offersBefore && <Suggestions from={last?.from ?? ''} values={[before]} onTake={take} />}
      <Suggestions
        from={words.worksheet.fromSite}
        values={names.filter((name) => !isSame(name, typed) && !isSame(name, before))}
        onTake={take}
      />
    </>
  );
}

/** Circuits on the cover of that panel, and the one of the last worksheet on it. */
export function CircuitSuggestions() {
  const words = useMessages();
  const { content } = useWorksheetForm();
  const panel = useKnownPanel();
  const last = useLastHere();
  const take = useSetField('supply.circuit');
  const { panel: typedPanel, circuit: typed } = content.supply ?? {};
  if (typed !== undefined && typed !== '') return null;
  const supply = last?.content.supply;
  const before = isSame(supply?.panel, typedPanel) ? supply?.circuit : undefined;
  const circuits = (panel?.circuits ?? []).filter((circuit) => !isSame(circuit, before));
  return (
    <>
      {before !== undefined && (
        <Suggestions from={last?.from ?? ''} values={[before]} onTake={take} />
      )}
      {circuits.length <= MOST_CIRCUITS && (
        <Suggestions from={words.worksheet.fromSite} values={circuits} onTake={take} />
      )}
    </>
  );
}
