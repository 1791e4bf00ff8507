import { StyleSheet, View } from 'react-native';
import type { WorksheetRecord } from '@/shared/record';
import type { SectionId } from '@/shared/sections';
import { useMessages } from '../../i18n/useMessages';
import { space } from '../../theme/tokens';
import { Button, Text } from '../../ui';
import { photoFiles } from '../photos/photoFiles';
import {
  askedSection,
  mayChangePhotos,
  photosOf,
  type AskedSection,
} from '../photos/photoSections';
import { PhotoTiles } from '../photos/PhotoTiles';
import { usePhotos } from '../photos/usePhotos';
import { WaitingTile } from '../photos/WaitingTile';

const MOST = 20;

/** The photos of a section that may still change: what the server has, what waits here, and how to add one. */
function OpenPhotos({ record, section }: { record: WorksheetRecord; section: AskedSection }) {
  const { photos: words } = useMessages();
  const { waiting, choose, caption, drop, send, recaption, remove } = usePhotos(record, section);
  const full = record.attachments.length + waiting.length >= MOST;
  return (
    <View role="group" aria-label={words.purpose[section]} style={styles.box}>
      <View>
        <Text variant="strong">{words.purpose[section]}</Text>
        <Text variant="label" weight="400" color="ink2">
          {photoFiles.canPick ? words.hint : words.notHere}
        </Text>
      </View>
      <PhotoTiles
        photos={photosOf(record, section)}
        changes={{ onCaption: recaption, onRemove: remove }}
      />
      {waiting.map((photo) => (
        <WaitingTile
          key={photo.id}
          photo={photo}
          onCaption={(text) => caption(photo.id, text)}
          onSend={() => void send(photo.id)}
          onDrop={() => drop(photo.id)}
        />
      ))}
      {photoFiles.canPick && full && <Text variant="label">{words.most}</Text>}
      {photoFiles.canPick && !full && (
        <View style={styles.buttons}>
          {photoFiles.hasCamera() && (
            <Button icon="camera" label={words.take} onPress={() => void choose('camera')} />
          )}
          <Button
            icon={photoFiles.hasCamera() ? 'document' : 'camera'}
            label={words.choose}
            onPress={() => void choose('files')}
          />
        </View>
      )}
    </View>
  );
}

interface Props {
  record: WorksheetRecord;
  section: SectionId;
}

/** Photos of one section; where none may be added and there are none, nothing. */
export function SectionPhotos({ record, section }: Props) {
  const { photos: words } = useMessages();
  const asked = askedSection(section);
  if (asked !== undefined && mayChangePhotos(record, section)) {
    return <OpenPhotos record={record} section={asked} />;
  }
  const photos = photosOf(record, section);
  if (photos.length === 0) return null;
  return (
    <View style={styles.box}>
      <Text variant="strong">{words.title}</Text>
      <PhotoTiles photos={photos} />
    </View>
  );
}

const styles = StyleSheet.create({
  box: { gap: space.sm },
  buttons: { flexDirection: 'row', flexWrap: 'wrap', gap: 10 },
});
