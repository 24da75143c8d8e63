import { useCallback, useState } from 'react';
import { v7 as uuid } from 'uuid';
import { uploadCaptions } from '../../shared/api/media';
import { limits } from '../../shared/api/limits';
import { jot, readCaptions, toDraft } from '../../shared/captions';
import { Rational } from '../../shared/measure';
import { stepSchema, type Clip, type PlanDocument } from '../../shared/plan/document';
import { clockTime } from '../../shared/plan/stick/spoken';
import { upload } from '../data/api-client';
import { tell } from '../data/problems';
import { ClipPlayer } from '../plans/clip-player';
import { ClipUpload, type ArrivedClip } from '../uploads/clip-upload';
import { MediaLine } from '../uploads/media-line';
import { useOwnMedia } from '../uploads/media-queries';
import { Banner } from '../ui/banner';
import { Button } from '../ui/button';
import { FilePick } from '../ui/file-pick';
import { Heading } from '../ui/heading';
import { Row, Section, Stack } from '../ui/layout';
import { Text } from '../ui/text';
import { TextField } from '../ui/text-field';
import { type ClipPlace } from './clip-place';
import { type DraftEditor } from './use-draft-editor';

const perUnit: Record<string, Rational> = {
  in: Rational.of(127, 5),
  mm: Rational.of(1),
  ft: Rational.of(1524, 5),
};

/** Timed steps from a caption file, with what was heard in each. */
export function stepsFromCaptions(text: string): PlanDocument['steps'] {
  const jottings = jot(readCaptions(text));
  return toDraft(jottings)
    .filter((step) => step.phase === 'build' || step.phase === 'demo')
    .map((step) =>
      stepSchema.parse({
        id: uuid(),
        title: step.title.slice(0, limits.title),
        phase: step.phase === 'demo' ? 'demo' : 'build',
        stretches: [{ start: step.start, end: step.end }],
        cautions: step.cautions.map((c) => ({ id: uuid(), text: c.text, at: c.t })),
        heard: step.measures.flatMap((m) => {
          const unit = perUnit[m.unit];
          if (m.value === null || !unit) return [];
          const value = {
            text: `${m.value} ${m.unit}`,
            mm: Rational.fromNumber(m.value).times(unit).toString(),
          };
          return [{ id: uuid(), at: m.t, words: m.text.slice(0, 300), unit: m.unit, value }];
        }),
      }),
    );
}

/** Brings caption files into the draft. */
function useCaptionFile({ document, change }: Pick<DraftEditor, 'document' | 'change'>) {
  const [trouble, setTrouble] = useState<string | null>(null);
  const [found, setFound] = useState<string | null>(null);
  const { clip } = document;
  const bringCaptions = async (file: File | undefined) => {
    if (!file) return;
    setTrouble(null);
    try {
      const text = await file.text();
      const { media } = await upload(uploadCaptions, file);
      const steps = stepsFromCaptions(text);
      change((d) => ({
        ...d,
        clip: d.clip.source === 'none' ? d.clip : { ...d.clip, captions: media.hash },
        steps: d.steps.length > 0 ? d.steps : steps,
      }));
      const heard = steps.reduce((n, s) => n + s.heard.length, 0);
      const unclipped =
        clip.source === 'none'
          ? ' Bring the clip, then the captions once more, to see them beside it.'
          : '';
      setFound(
        document.steps.length > 0
          ? `The captions were read. Your steps stay as they are.${unclipped}`
          : `${steps.length} steps and ${heard} figures were jotted down. Look through them.${unclipped}`,
      );
    } catch (error) {
      setTrouble(tell(error).text);
    }
  };
  return { trouble, found, bringCaptions };
}

/** The clip once it can play; until then how far it is. */
function DraftClip({ clip, place }: { clip: Clip; place: ClipPlace }) {
  const hash = clip.source === 'upload' ? clip.media : undefined;
  const { data: media } = useOwnMedia(hash);
  const playable = !media || media.renditions.includes('720');
  return (
    <>
      {hash ? <MediaLine hash={hash} /> : null}
      {playable ? (
        <ClipPlayer clip={clip} seek={place.seek} onTime={place.setNow} label="Clip of the draft" />
      ) : null}
    </>
  );
}

/** The clip and its captions: brought, watched, turned into steps. */
export function ClipPane({
  editor: { document, change },
  place,
}: {
  editor: DraftEditor;
  place: ClipPlace;
}) {
  const { clip } = document;
  const { trouble, found, bringCaptions } = useCaptionFile({ document, change });
  const takeClip = useCallback(
    ({ hash, duration }: ArrivedClip) =>
      change((d) => {
        const captions = d.clip.source === 'none' ? undefined : d.clip.captions;
        const kept = captions ? { captions } : {};
        return {
          ...d,
          clip: { source: 'upload', media: hash, duration: duration ?? 0, ...kept },
        };
      }),
    [change],
  );
  return (
    <Section>
      <Heading level={2}>Clip</Heading>
      {trouble ? <Banner kind="fails">{trouble}</Banner> : null}
      {found ? (
        <Banner kind="holds" announce>
          {found}
        </Banner>
      ) : null}
      {clip.source === 'none' ? (
        <Text tone="ink2">Bring a clip, or the address of a video hosted elsewhere.</Text>
      ) : (
        <DraftClip clip={clip} place={place} />
      )}
      {clip.source === 'none' ? null : (
        <Text mono>
          {clockTime(place.now)} of {clockTime(clip.duration)}
        </Text>
      )}
      <Row gap={16} wrap align="flex-start">
        <ClipUpload
          planId={document.id}
          hash={clip.source === 'upload' ? clip.media : undefined}
          onArrived={takeClip}
        />
        <FilePick
          label="Caption file"
          accept=".vtt,.srt,text/vtt"
          maxBytes={limits.captionBytes}
          onFiles={(files) => void bringCaptions(files[0])}
        />
      </Row>
      {clip.source === 'upload' ? null : <Hosted editor={{ document, change }} />}
    </Section>
  );
}

function Hosted({
  editor: { document, change },
}: {
  editor: Pick<DraftEditor, 'document' | 'change'>;
}) {
  const known = document.clip.source === 'hosted' ? document.clip : null;
  const [url, setUrl] = useState(known?.url ?? '');
  const [length, setLength] = useState(known ? String(Math.round(known.duration / 60)) : '');
  const [fault, setFault] = useState<string | undefined>();
  const keep = () => {
    const minutes = Number(length);
    const bad = !/^https?:\/\/\S+\.\S+/.test(url)
      ? 'An address begins with https://'
      : !(minutes > 0)
        ? 'Say how many minutes it lasts.'
        : undefined;
    setFault(bad);
    if (!bad)
      change((d) => ({
        ...d,
        clip: {
          source: 'hosted',
          url,
          duration: minutes * 60,
          claimed: false,
          ...(d.clip.source !== 'none' && d.clip.captions ? { captions: d.clip.captions } : {}),
        },
      }));
  };
  return (
    <Stack gap={12}>
      <TextField
        label="Or the address of a hosted video"
        type="url"
        value={url}
        onChange={setUrl}
        error={fault}
      />
      <TextField
        label="It lasts, minutes"
        inputMode="numeric"
        value={length}
        onChange={setLength}
      />
      <Row>
        <Button label="Use the hosted video" onPress={keep} />
      </Row>
    </Stack>
  );
}
