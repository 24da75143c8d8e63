import { Image, StyleSheet, View } from 'react-native';
import { mediaPath } from '../../shared/api/media';
import { type PlanDocument, type Step } from '../../shared/plan/document';
import { Row } from '../ui/layout';
import { colour, line } from '../ui/tokens';
import { webStyle } from '../ui/web-style';

/** The photos of a step. */
export function StepPhotos({ step, document }: { step: Step; document: PlanDocument }) {
  const photos = step.photoIds.flatMap((id) => document.photos.find((p) => p.id === id) ?? []);
  if (photos.length === 0) return null;
  return (
    <Row gap={12} wrap>
      {photos.map((photo) => (
        <View key={photo.id} style={styles.frame}>
          <Image
            source={{ uri: mediaPath(photo.media, 'large') }}
            alt={photo.alt}
            style={styles.picture}
            resizeMode="contain"
          />
        </View>
      ))}
    </Row>
  );
}

const styles = StyleSheet.create({
  picture: { width: '100%', height: '100%' },
  frame: webStyle({
    width: '100%',
    maxWidth: 420,
    aspectRatio: '3 / 2',
    borderWidth: line.thin,
    borderStyle: 'solid',
    borderColor: colour.rule,
    backgroundColor: colour.well,
  }),
});
