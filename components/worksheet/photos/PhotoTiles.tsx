import { useState } from 'react';
import { Image, Pressable, StyleSheet, View } from 'react-native';
import type { Attachment } from '@/shared/record';
import { openUrl } from '../../api/openUrl';
import { apiUrl } from '../../api/request';
import { useMessages } from '../../i18n/useMessages';
import { space } from '../../theme/tokens';
import { useTheme } from '../../theme/useTheme';
import { Button, Text, TextField } from '../../ui';

/** Answers with what went wrong, in words. */
type Change<Rest extends unknown[]> = (id: string, ...rest: Rest) => Promise<string | undefined>;

interface Changes {
  onCaption: Change<[caption: string]>;
  onRemove: Change<[]>;
}

interface FormProps {
  photo: Attachment;
  onSave: (caption: string) => Promise<void>;
  onCancel: () => void;
}

function CaptionForm({ photo, onSave, onCancel }: FormProps) {
  const { photos: words } = useMessages();
  const [caption, setCaption] = useState(photo.caption);
  const [busy, setBusy] = useState(false);
  const handleSave = () => {
    setBusy(true);
    void onSave(caption.trim()).finally(() => setBusy(false));
  };
  return (
    <>
      <TextField
        id={`caption-${photo.id}`}
        label={words.caption}
        hint={words.captionHint}
        value={caption}
        onChangeText={setCaption}
        onSubmitEditing={handleSave}
        maxLength={200}
        autoFocus
      />
      <Button label={words.saveCaption} busy={busy} onPress={handleSave} />
      <Button kind="quiet" label={words.cancel} onPress={onCancel} />
    </>
  );
}

type Act = 'caption' | 'remove' | undefined;

interface ActsProps extends Changes {
  photo: Attachment;
  act: Act;
  setAct: (act: Act) => void;
}

/** What can be done with a photo while nobody has signed it. */
function Acts({ photo, act, setAct, onCaption, onRemove }: ActsProps) {
  const { photos: words } = useMessages();
  const [fault, setFault] = useState<string>();
  const caption = photo.caption === '' ? words.noCaption : photo.caption;
  const end = async (done: Promise<string | undefined>) => {
    setFault(await done);
    setAct(undefined);
  };
  return (
    <>
      {fault !== undefined && (
        <Text variant="label" weight="600" aria-live="polite">
          {fault}
        </Text>
      )}
      {act === 'caption' && (
        <CaptionForm
          photo={photo}
          onSave={(text) => end(onCaption(photo.id, text))}
          onCancel={() => setAct(undefined)}
        />
      )}
      {act === 'remove' && (
        <>
          <Text variant="label">{words.removeSure}</Text>
          <Button label={words.remove} onPress={() => void end(onRemove(photo.id))} />
          <Button kind="quiet" label={words.keep} onPress={() => setAct(undefined)} />
        </>
      )}
      {act === undefined && (
        <>
          <Button
            kind="quiet"
            icon="pen"
            label={words.editCaption}
            aria-label={words.editCaptionOf(caption)}
            onPress={() => setAct('caption')}
          />
          <Button
            kind="quiet"
            icon="close"
            label={words.remove}
            aria-label={words.removeOf(caption)}
            onPress={() => setAct('remove')}
          />
        </>
      )}
    </>
  );
}

/** One photo of the record: its picture opens it in full. */
function PhotoTile({ photo, changes }: { photo: Attachment; changes?: Changes }) {
  const { photos: words } = useMessages();
  const { colors } = useTheme();
  const [act, setAct] = useState<Act>();
  const caption = photo.caption === '' ? words.noCaption : photo.caption;
  return (
    <View role="listitem" style={act === 'caption' ? styles.wide : styles.tile}>
      <Pressable
        role="link"
        aria-label={words.open(caption)}
        onPress={() => openUrl(apiUrl(`/attachments/${photo.id}`))}
        style={[styles.tile, styles.frame, { borderColor: colors.blue }]}
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
      {changes !== undefined && <Acts photo={photo} act={act} setAct={setAct} {...changes} />}
    </View>
  );
}

interface TilesProps {
  photos: readonly Attachment[];
  /** Left out where the photos are frozen. */
  changes?: Changes;
}

/** The photos that the server has. */
export function PhotoTiles({ photos, changes }: TilesProps) {
  if (photos.length === 0) return null;
  return (
    <View role="list" style={styles.tiles}>
      {photos.map((photo) => (
        <PhotoTile key={photo.id} photo={photo} changes={changes} />
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  tiles: { flexDirection: 'row', flexWrap: 'wrap', gap: space.md },
  tile: { width: 164, gap: space.xxs },
  // The words are written over the whole width: a caption is longer than its picture.
  wide: { width: '100%', gap: space.xs },
  frame: { borderWidth: 1.5 },
  image: { width: '100%', aspectRatio: 4 / 3 },
});
