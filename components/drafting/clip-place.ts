import { useMemo, useState } from 'react';

/** Where the clip is, and how to send it elsewhere; shared by the clip, the captions and the steps. */
export interface ClipPlace {
  now: number;
  setNow: (seconds: number) => void;
  seek: { seconds: number } | null;
  goTo: (seconds: number) => void;
}

export function useClipPlace(): ClipPlace {
  const [now, setNow] = useState(0);
  const [seek, setSeek] = useState<{ seconds: number } | null>(null);
  return useMemo(
    () => ({
      now,
      setNow,
      seek,
      goTo: (seconds: number) => {
        setSeek({ seconds });
        setNow(seconds);
      },
    }),
    [now, seek],
  );
}
