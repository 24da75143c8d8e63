import { useState } from 'react';
import { Image, StyleSheet } from 'react-native';
import { v7 as uuid } from 'uuid';
import { limits } from '../../shared/api/limits';
import { mediaPath, uploadPhoto } from '../../shared/api/media';
import { type Photo, type PlanDocument, type Step } from '../../shared/plan/document';
import { upload } from '../data/api-client';
import { tell } from '../data/problems';
import { Banner } from '../ui/banner';
import { Button } from '../ui/button';
import { MediaLine } from '../uploads/media-line';
import { FilePick } from '../ui/file-pick';
import { Row, Stack } from '../ui/layout';
import { Progress } from '../ui/progress';
import { colour, line } from '../ui/tokens';
import { LimitedField } from './fields/limited-field';
import { type DraftEditor } from './use-draft-editor';

/** The plan with a photo added to one of its steps. */
export function withPhoto(document: PlanDocument, stepId: string, photo: Photo): PlanDocument {
  return {
    ...document,
    photos: [...document.photos, photo],
    steps: document.steps.map((s) =>
      s.id === stepId ? { ...s, photoIds: [...s.photoIds, photo.id] } : s,
    ),
  };
}

/** The plan without a photo: in the list and in every step. */
export function withoutPhoto(document: PlanDocument, photoId: string): PlanDocument {
  return {
    ...document,
    photos: document.photos.filter((p) => p.id !== photoId),
    steps: document.steps.map((s) => ({
      ...s,
      photoIds: s.photoIds.filter((id) => id !== photoId),
    })),
  };
}

/** Photos of a step, several at once, each with words for those who cannot see it. */
export function StepPhotos({ step, editor }: { step: Step; editor: DraftEditor }) {
  const { document, change } = editor;
  const [progress, setProgress] = useState<number | null>(null);
  const [faults, setFaults] = useState<readonly string[]>([]);
  const bring = async (files: readonly File[]) => {
    const wrong: string[] = [];
    for (const [i, file] of files.entries()) {
      setProgress(i / files.length);
      try {
        const { media } = await upload(uploadPhoto, file, {
          onProgress: (sent, total) => setProgress((i + sent / total) / files.length),
        });
        const photo: Photo = { id: uuid(), media: media.hash, alt: '', marks: [] };
        change((d) => withPhoto(d, step.id, photo));
      } catch (error) {
        wrong.push(`${file.name}: ${tell(error).text}`);
      }
    }
    setProgress(null);
    setFaults(wrong);
  };
  const photos = step.photoIds.flatMap((id) => document.photos.find((p) => p.id === id) ?? []);
  const say = (photo: Photo, alt: string) =>
    change((d) => ({
      ...d,
      photos: d.photos.map((p) => (p.id === photo.id ? { ...p, alt } : p)),
    }));
  return (
    <Stack gap={12}>
      {faults.map((text) => (
        <Banner key={text} kind="fails">
          {text}
        </Banner>
      ))}
      {photos.map((photo, i) => (
        <Stack key={photo.id} gap={8}>
          <Image
            source={{ uri: mediaPath(photo.media, 'thumb') }}
            alt={photo.alt || `Photo ${i + 1}`}
            style={styles.picture}
            resizeMode="contain"
          />
          <MediaLine hash={photo.media} />
          <LimitedField
            label={`What photo ${i + 1} shows, for those who cannot see it`}
            most={limits.note}
            value={photo.alt}
            onChange={(alt) => say(photo, alt)}
          />
          <Row>
            <Button
              size="small"
              label={`Take photo ${i + 1} out`}
              onPress={() => change((d) => withoutPhoto(d, photo.id))}
            />
          </Row>
        </Stack>
      ))}
      {progress === null ? null : (
        <Progress label={`Uploading, ${Math.round(progress * 100)} per cent`} value={progress} />
      )}
      <FilePick
        label="Add photos"
        accept="image/*"
        multiple
        maxBytes={limits.photoBytes}
        onFiles={(files) => void bring(files)}
      />
    </Stack>
  );
}

const styles = StyleSheet.create({
  picture: {
    width: 240,
    height: 160,
    borderWidth: line.thin,
    borderColor: colour.rule,
    backgroundColor: colour.well,
  },
});
