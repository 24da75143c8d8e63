import { useMemo, useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { mediaPath } from '../../shared/api/media';
import { type Clip, type PlanDocument, type Step } from '../../shared/plan/document';
import { clockTime } from '../../shared/plan/stick/spoken';
import { useCues } from '../drafting/captions-list';
import { ClipPlayer } from '../plans/clip-player';
import { useKeptCut } from '../service-worker/use-kept';
import { Icon } from '../ui/icon';
import { IconButton } from '../ui/icon-button';
import { Button } from '../ui/button';
import { Row, Stack } from '../ui/layout';
import { SegmentedControl } from '../ui/radio-group';
import { Text } from '../ui/text';
import { colour, line } from '../ui/tokens';
import { useStretch, type Stretch } from './use-stretch';

type Own = Extract<Clip, { source: 'upload' }>;

/** The clip of a step: only its stretch, over and over. It never goes on to another step by itself. */
export function BenchClip({ step, document }: { step: Step; document: PlanDocument }) {
  const { clip, cover } = document;
  const [which, setWhich] = useState(0);
  const stretch = step.stretches[which] ?? step.stretches[0];
  if (!stretch || clip.source === 'none') return null;
  const label = `Clip of step: ${step.title}`;
  if (clip.source === 'hosted')
    return <ClipPlayer clip={clip} stretch={stretch} label={label} cover={cover} />;
  return (
    <Stack gap={8}>
      <Player
        key={`${stretch.start}-${stretch.end}`}
        clip={clip}
        stretch={stretch}
        label={label}
        cover={cover}
      />
      {step.stretches.length > 1 ? (
        <SegmentedControl
          label="Stretch of the clip"
          options={step.stretches.map((each, i) => ({
            value: String(i),
            label: `${clockTime(each.start)}–${clockTime(each.end)}`,
          }))}
          value={String(which)}
          onChange={(value) => setWhich(Number(value))}
        />
      ) : null}
    </Stack>
  );
}

interface PlayerProps {
  clip: Own;
  stretch: Stretch;
  label: string;
  cover: string | undefined;
}

function Player({ clip, stretch, label, cover }: PlayerProps) {
  const cut = useKeptCut(clip.media, stretch);
  const source = cut ?? { path: mediaPath(clip.media, '720'), from: 0 };
  const [failed, setFailed] = useState(false);
  const [captioned, setCaptioned] = useState(true);
  const { video, at, playing, slow, setSlow, toStart, onPlaying, toggle, frame, again } =
    useStretch(stretch, source.from);
  if (failed)
    return (
      <Text tone="ink2">
        The clip did not load. The text below says all you need; the clip comes back with the
        signal.
      </Text>
    );
  return (
    <Stack gap={8}>
      <View style={styles.frame}>
        <video
          ref={video}
          style={picture}
          playsInline
          preload="metadata"
          aria-label={label}
          poster={cover ? mediaPath(cover, 'large') : undefined}
          src={source.path}
          onLoadedMetadata={toStart}
          onPlay={onPlaying}
          onPause={onPlaying}
          onClick={toggle}
          onEnded={again}
          onError={() => setFailed(true)}
        />
        <View style={styles.chip}>
          <Icon name="loop" size={20} tone="film" />
          <Text size="note" tone="film" mono>
            {clockTime(stretch.start)}–{clockTime(stretch.end)}
          </Text>
        </View>
      </View>
      {captioned ? <CaptionLine hash={clip.captions} at={at} /> : null}
      <Row gap={8} wrap>
        <IconButton
          size="bench"
          icon={playing ? 'pause' : 'play'}
          label={playing ? 'Stop the clip' : 'Play the clip'}
          onPress={toggle}
        />
        <IconButton size="bench" icon="back" label="One frame back" onPress={() => frame(-1)} />
        <IconButton size="bench" icon="next" label="One frame on" onPress={() => frame(1)} />
        <Button size="bench" label="Half speed" pressed={slow} onPress={() => setSlow(!slow)}>
          ½ speed
        </Button>
        {clip.captions ? (
          <IconButton
            size="bench"
            icon="captions"
            label="Captions"
            pressed={captioned}
            onPress={() => setCaptioned(!captioned)}
          />
        ) : null}
      </Row>
    </Stack>
  );
}

/** What is said now, in type that can be read at arm's length. It keeps its height, so that nothing jumps. */
function CaptionLine({ hash, at }: { hash: string | undefined; at: number }) {
  const { cues } = useCues(hash);
  const said = useMemo(
    () => cues.find((cue) => cue.start <= at && at < cue.end)?.text ?? '',
    [cues, at],
  );
  if (!hash) return null;
  return (
    <View style={styles.said}>
      <Text size="lead">{said}</Text>
    </View>
  );
}

const picture = {
  width: '100%',
  aspectRatio: '16 / 9',
  display: 'block',
  background: colour.well,
} as const;
const styles = StyleSheet.create({
  frame: { borderWidth: line.medium, borderColor: colour.ink },
  chip: {
    position: 'absolute',
    top: 0,
    left: 0,
    flexDirection: 'row',
    alignItems: 'center',
    gap: 8,
    paddingHorizontal: 10,
    paddingVertical: 6,
    backgroundColor: colour.ink,
  },
  said: { minHeight: 56, justifyContent: 'center' },
});
