import { useCallback, useEffect, useRef, useState } from 'react';

export interface Stretch {
  start: number;
  end: number;
}

/** A step forth or back when the film has not shown yet how long its frames are: 25 a second. */
const usualFrame = 1 / 25;

/** Calls back for every frame that is shown, or a few times a second where browsers do not tell. */
function eachFrame(video: HTMLVideoElement, show: (mediaTime: number) => void): () => void {
  if ('requestVideoFrameCallback' in video) {
    let id = 0;
    const next = (_now: number, { mediaTime }: { mediaTime: number }) => {
      show(mediaTime);
      id = video.requestVideoFrameCallback(next);
    };
    id = video.requestVideoFrameCallback(next);
    return () => video.cancelVideoFrameCallback(id);
  }
  const element: HTMLVideoElement = video;
  const tick = () => show(element.currentTime);
  element.addEventListener('timeupdate', tick);
  return () => element.removeEventListener('timeupdate', tick);
}

/**
 * Plays one stretch of a clip over and over, at full or half speed, or frame by frame. `from` is the second
 * of the clip the file begins at (a cut file does not begin at 0). `at` is the second of the clip on show.
 */
export function useStretch({ start, end }: Stretch, from: number) {
  const video = useRef<HTMLVideoElement>(null);
  const frameLength = useRef(usualFrame);
  const [at, setAt] = useState(start);
  const [playing, setPlaying] = useState(false);
  const [slow, setSlow] = useState(false);
  const seek = useCallback(
    (to: number) => {
      const element = video.current;
      if (element) element.currentTime = Math.max(start, Math.min(end, to)) - from;
    },
    [start, end, from],
  );
  useEffect(() => {
    const element = video.current;
    if (!element) return;
    let before = Number.NaN;
    return eachFrame(element, (mediaTime) => {
      const now = mediaTime + from;
      const step = mediaTime - before;
      if (step > 0.005 && step < 0.2 && !element.paused) frameLength.current = step;
      before = mediaTime;
      if (!element.paused && (now >= end || now < start - 0.5)) seek(start);
      // Quarters of a second are enough for captions, and spare the page the other frames.
      setAt(Math.floor(now * 4) / 4);
    });
  }, [start, end, from, seek]);
  useEffect(() => {
    if (video.current) video.current.playbackRate = slow ? 0.5 : 1;
  }, [slow]);
  return {
    video,
    at,
    playing,
    slow,
    setSlow,
    toStart: () => seek(start),
    onPlaying: () => setPlaying(video.current?.paused === false),
    toggle: () => {
      const element = video.current;
      if (!element) return;
      // A file cut for this stretch ends with it: from its end it begins again.
      if (element.ended) seek(start);
      if (element.paused) void element.play().catch(() => undefined);
      else element.pause();
    },
    frame: (frames: number) => {
      const element = video.current;
      if (!element) return;
      element.pause();
      seek(element.currentTime + from + frames * frameLength.current);
    },
    again: () => {
      seek(start);
      void video.current?.play().catch(() => undefined);
    },
  };
}
