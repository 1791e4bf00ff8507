import { Image, StyleSheet, View } from 'react-native';
import { useMessages } from '../../i18n/useMessages';
import { space } from '../../theme/tokens';
import { useTheme } from '../../theme/useTheme';
import { Button, Text, TextField } from '../../ui';
import type { ShownPhoto } from './usePhotos';

interface WaitingProps {
  photo: ShownPhoto;
  onCaption: (caption: string) => void;
  onSend: () => void;
  onDrop: () => void;
}

/** A photo on this device: its caption is written before it goes. */
export function WaitingTile({ photo, onCaption, onSend, onDrop }: WaitingProps) {
  const { photos: words } = useMessages();
  const { colors } = useTheme();
  const { sending, fault, hopeless, caption, name } = photo;
  return (
    <View style={[styles.waiting, { borderColor: colors.ink }]}>
      {hopeless !== true && (
        <Image
          source={{ uri: photo.url }}
          alt={caption === '' ? words.noCaption : caption}
          resizeMode="cover"
          style={styles.preview}
        />
      )}
      <View style={styles.fields}>
        {fault !== undefined && (
          <Text variant="strong" aria-live="polite">
            {name === undefined ? fault : `${name}: ${fault}`}
          </Text>
        )}
        {hopeless !== true && (
          <TextField
            id={`photo-${photo.id}`}
            label={words.caption}
            hint={words.captionHint}
            value={caption}
            onChangeText={onCaption}
            maxLength={200}
          />
        )}
        {sending !== undefined ? (
          <View role="status" style={styles.progress}>
            <Text variant="answer">{words.sending(sending)}</Text>
            <View style={[styles.track, { borderColor: colors.ink }]}>
              <View style={[styles.gone, { width: `${sending}%`, backgroundColor: colors.ink }]} />
            </View>
          </View>
        ) : (
          <>
            {hopeless !== true && (
              <Button
                kind="primary"
                icon="arrow-up"
                label={fault === undefined ? words.send : words.again}
                onPress={onSend}
              />
            )}
            {hopeless !== true && (
              <Text variant="label" weight="400" color="ink2">
                {words.keptHere}
              </Text>
            )}
            <Button kind="quiet" icon="close" label={words.drop} onPress={onDrop} />
          </>
        )}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  waiting: {
    borderWidth: 2,
    padding: 14,
    gap: space.md,
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'flex-start',
  },
  preview: { width: 164, aspectRatio: 4 / 3 },
  fields: { flexGrow: 1, flexShrink: 1, flexBasis: 220, gap: space.sm },
  progress: { gap: space.xs },
  track: { borderWidth: 2, height: 14 },
  gone: { height: 10 },
});
