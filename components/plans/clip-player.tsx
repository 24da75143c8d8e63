import { useEffect, useRef, useState, type CSSProperties } from 'react';
import { mediaPath } from '../../shared/api/media';
import { type Clip } from '../../shared/plan/document';
import { clockTime } from '../../shared/plan/stick/spoken';
import { loadText } from '../data/api-client';
import { Link } from '../ui/link';
import { Text } from '../ui/text';
import { colour, line } from '../ui/tokens';

const frame: CSSProperties = {
  width: '100%',
  aspectRatio: '16 / 9',
  display: 'block',
  border: `${line.medium}px solid ${colour.ink}`,
  background: colour.well,
  boxSizing: 'border-box',
};

export interface ClipPlayerProps {
  clip: Clip;
  /** Plays only this stretch, over and over. */
  stretch?: { start: number; end: number } | undefined;
  onTime?: (seconds: number) => void;
  /** Change it to jump: `{seconds}` in a new object each time. */
  seek?: { seconds: number } | null;
  label: string;
  cover?: string | undefined;
}

/** The address of a hosted video at a moment; only its own tab plays it. */
export function momentOf(url: string, seconds: number): string {
  const address = new URL(url);
  address.searchParams.set('t', String(Math.floor(seconds)));
  return address.toString();
}

/** The clip, or a way to open it at the moment where it is hosted elsewhere. Nothing of a third party is loaded. */
export function ClipPlayer(props: ClipPlayerProps) {
  const { clip, stretch, seek } = props;
  if (clip.source === 'none') return null;
  if (clip.source === 'hosted') {
    const at = seek?.seconds ?? stretch?.start ?? 0;
    return (
      <Text>
        <Link href={momentOf(clip.url, at)}>Open the video at {clockTime(at)}</Link>
        {clip.claimed ? null : '. Not by the video’s maker, as far as we know.'}
      </Text>
    );
  }
  return <OwnClip {...props} media={clip.media} captions={clip.captions} />;
}

function OwnClip({
  media,
  captions,
  stretch,
  onTime,
  seek,
  label,
  cover,
}: ClipPlayerProps & { media: string; captions?: string | undefined }) {
  const video = useRef<HTMLVideoElement>(null);
  const [failed, setFailed] = useState(false);
  const track = useCaptionTrack(captions);
  useEffect(() => {
    if (video.current && seek) video.current.currentTime = seek.seconds;
  }, [seek]);
  const from = stretch?.start;
  const to = stretch?.end;
  useEffect(() => {
    const element = video.current;
    if (!element || from === undefined) return;
    if (element.currentTime < from || element.currentTime > (to ?? Infinity))
      element.currentTime = from;
  }, [from, to]);
  const tick = () => {
    const element = video.current;
    if (!element) return;
    if (
      from !== undefined &&
      to !== undefined &&
      (element.currentTime >= to || element.currentTime < from - 0.5)
    )
      element.currentTime = from;
    onTime?.(element.currentTime);
  };
  if (failed) {
    return (
      <Text tone="ink2">
        The clip did not load. The text below says all you need; the clip comes back with the
        signal.
      </Text>
    );
  }
  return (
    <video
      ref={video}
      style={frame}
      controls
      playsInline
      preload="metadata"
      aria-label={label}
      poster={cover ? mediaPath(cover, 'large') : undefined}
      src={mediaPath(media, '720')}
      onTimeUpdate={tick}
      onLoadedMetadata={() => {
        if (video.current && from !== undefined) video.current.currentTime = from;
      }}
      onError={() => setFailed(true)}
    >
      {track ? <track kind="captions" src={track} srcLang="en" label="Captions" default /> : null}
    </video>
  );
}

const tracks = new Map<string, Promise<string | null>>();

/**
 * Captions come from another origin, which a track may not load: they are fetched and handed over as a blob,
 * one for all players of a page and for as long as it stays, since a player may still be reading it.
 */
function captionTrack(hash: string): Promise<string | null> {
  const known = tracks.get(hash);
  if (known) return known;
  const made = loadText(mediaPath(hash, 'original')).then((text) => {
    if (text !== null) return URL.createObjectURL(new Blob([text], { type: 'text/vtt' }));
    tracks.delete(hash);
    return null;
  });
  tracks.set(hash, made);
  return made;
}

function useCaptionTrack(hash: string | undefined): string | null {
  const [address, setAddress] = useState<string | null>(null);
  useEffect(() => {
    if (!hash) return;
    let gone = false;
    void captionTrack(hash).then((url) => {
      if (!gone) setAddress(url);
    });
    return () => {
      gone = true;
    };
  }, [hash]);
  return address;
}
