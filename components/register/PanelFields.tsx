import { StyleSheet, View } from 'react-native';
import { z } from 'zod';
import { SYSTEMS } from '@/hazard';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Button, Select, Text, TextField } from '../ui';

export const panelFormSchema = z.object({
  name: z.string(),
  system: z.enum(SYSTEMS).optional(),
  circuits: z.string(),
});
export type PanelForm = z.infer<typeof panelFormSchema>;

/** `2, 4 ; 6` as the circuits that it names. */
export const circuitsOf = (typed: string): string[] =>
  typed
    .split(/[,;\n]/)
    .map((circuit) => circuit.trim())
    .filter((circuit) => circuit !== '');

interface Props {
  panels: readonly PanelForm[];
  onChange: (panels: PanelForm[]) => void;
  idOf: (name: string) => string;
  errorOf: (name: string) => string | undefined;
}

/** The panels of a site, each with its circuits as its cover names them. */
export function PanelFields({ panels, onChange, idOf, errorOf }: Props) {
  const { register, enumerations, ui } = useMessages();
  const { colors } = useTheme();
  const words = register.sites;
  const edit = (index: number, change: Partial<PanelForm>) =>
    onChange(panels.map((panel, at) => (at === index ? { ...panel, ...change } : panel)));
  return (
    <View role="group" aria-label={words.panels} style={styles.all}>
      <View>
        <Text variant="strong">{words.panels}</Text>
        <Text variant="label" weight="400" color="ink2">
          {words.panelsHint}
        </Text>
      </View>
      {panels.map((panel, index) => {
        const id = (field: string) => idOf(`panels.${index}.${field}`);
        const error = (field: string) => errorOf(`panels.${index}.${field}`);
        return (
          <View key={index} style={[styles.panel, { borderTopColor: colors.ink }]}>
            <TextField
              id={id('name')}
              label={words.panelName}
              value={panel.name}
              onChangeText={(name) => edit(index, { name })}
              error={error('name')}
              exact
              autoCapitalize="characters"
              maxLength={200}
            />
            <Select
              id={id('system')}
              label={`${words.panelSystem}, ${ui.optional}`}
              options={SYSTEMS.map((system) => ({
                value: system,
                label: enumerations.system[system],
              }))}
              value={panel.system}
              onChange={(system) => edit(index, { system })}
              onClear={() => edit(index, { system: undefined })}
            />
            <TextField
              id={id('circuits')}
              label={words.circuits}
              value={panel.circuits}
              onChangeText={(circuits) => edit(index, { circuits })}
              error={error('circuits')}
              exact
              maxLength={2000}
            />
            <Button
              kind="quiet"
              icon="close"
              label={words.removePanel(panel.name.trim() === '' ? String(index + 1) : panel.name)}
              onPress={() => onChange(panels.filter((_, at) => at !== index))}
            />
          </View>
        );
      })}
      <Button
        icon="plus"
        label={words.addPanel}
        onPress={() => onChange([...panels, { name: '', circuits: '' }])}
      />
    </View>
  );
}

const styles = StyleSheet.create({
  all: { gap: space.md },
  panel: { gap: space.sm, borderTopWidth: 1, paddingTop: space.sm },
});
