import { type Media } from '../../shared/api/media';
import { Banner } from '../ui/banner';
import { Stack } from '../ui/layout';
import { Progress } from '../ui/progress';
import { Text } from '../ui/text';
import { underWork, useOwnMedia, useWorkAgain } from './media-queries';

/** How it stands with the work on a clip or photo, in a sentence; null when there is nothing to say. */
export function mediaWords({ kind, state, reason }: Pick<Media, 'kind' | 'state' | 'reason'>) {
  const thing = kind === 'photo' ? 'photo' : 'clip';
  switch (state) {
    case 'waiting':
      return reason ?? `The ${thing} has arrived and waits for its turn to be made ready.`;
    case 'working':
      return `The ${thing} is being made ready for every screen. You can go on meanwhile.`;
    case 'refused':
      return `This ${thing} was not taken. ${reason ?? ''}`.trim();
    case 'failed':
      return reason ?? `The ${thing} could not be made ready.`;
    case 'ready':
      return null;
  }
}

/** Says how far the work on one of one's own files is: waiting, working, refused with its reason. */
export function MediaLine({ hash }: { hash: string }) {
  const { data: media } = useOwnMedia(hash);
  const again = useWorkAgain();
  const words = media ? mediaWords(media) : null;
  if (!media || !words) return null;
  if (!underWork(media)) {
    return (
      <Banner
        kind="fails"
        {...(media.state === 'failed'
          ? { action: { label: 'Try again', onPress: () => again.mutate(hash) } }
          : {})}
      >
        {words}
      </Banner>
    );
  }
  return (
    <Stack gap={8}>
      <Text role="status" tone="ink2">
        {words}
      </Text>
      {media.state === 'working' && media.kind === 'clip' ? (
        <Progress label="Making the clip ready" value={media.progress / 100} />
      ) : null}
    </Stack>
  );
}
