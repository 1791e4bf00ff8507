import { useState } from 'react';
import { Image, Pressable, StyleSheet, View } from 'react-native';
import type { Attachment } from '@/shared/record';
import { openUrl } from '../../api/openUrl';
import { apiUrl } from '../../api/request';
import { useMessages } from '../../i18n/useMessages';
import { space } from '../../theme/tokens';
import { useTheme } from '../../theme/useTheme';
import { Button, Text, TextField } from '../../ui';
import type { ShownPhoto } from './usePhotos';

/** One photo of the record: its picture opens it in full. */
function PhotoTile({
  photo,
  onRemove,
}: {
  photo: Attachment;
  onRemove?: (id: string) => Promise<string | undefined>;
}) {
  const { photos: words } = useMessages();
  const { colors } = useTheme();
  const [asks, setAsks] = useState(false);
  const [fault, setFault] = useState<string>();
  const caption = photo.caption === '' ? words.noCaption : photo.caption;
  const handleRemove = async () => {
    const said = await onRemove?.(photo.id);
    setAsks(false);
    setFault(said);
  };
  return (
    <View role="listitem" style={styles.tile}>
      <Pressable
        role="link"
        aria-label={words.open(caption)}
        onPress={() => openUrl(apiUrl(`/attachments/${photo.id}`))}
        style={[styles.frame, { borderColor: colors.blue }]}
      >
        <Image
          source={{ uri: apiUrl(`/attachments/${photo.id}/thumbnail`) }}
          alt={caption}
          resizeMode="cover"
          style={styles.image}
        />
      </Pressable>
      <Text variant="label" weight="400">
        {caption}
      </Text>
      {fault !== undefined && (
        <Text variant="label" weight="600" aria-live="polite">
          {fault}
        </Text>
      )}
      {onRemove !== undefined &&
        (asks ? (
          <>
            <Text variant="label">{words.removeSure}</Text>
            <Button label={words.remove} onPress={() => void handleRemove()} />
            <Button kind="quiet" label={words.keep} onPress={() => setAsks(false)} />
          </>
        ) : (
          <Button
            kind="quiet"
            icon="close"
            label={words.remove}
            aria-label={words.removeOf(caption)}
            onPress={() => setAsks(true)}
          />
        ))}
    </View>
  );
}

interface TilesProps {
  photos: readonly Attachment[];
  /** Left out where the photos are frozen. */
  onRemove?: (id: string) => Promise<string | undefined>;
}

/** The photos that the server has. */
export function PhotoTiles({ photos, onRemove }: TilesProps) {
  if (photos.length === 0) return null;
  return (
    <View role="list" style={styles.tiles}>
      {photos.map((photo) => (
        <PhotoTile key={photo.id} photo={photo} onRemove={onRemove} />
      ))}
    </View>
  );
}

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
  tiles: { flexDirection: 'row', flexWrap: 'wrap', gap: space.md },
  tile: { width: 164, gap: space.xxs },
  frame: { borderWidth: 1.5 },
  image: { width: '100%', aspectRatio: 4 / 3 },
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
