import { useQuery } from '@tanstack/react-query';
import { useEffect, useMemo, useRef } from 'react';
import { StyleSheet, View } from 'react-native';
import { mediaPath } from '../../shared/api/media';
import { readCaptions, type Cue } from '../../shared/captions';
import { clockTime } from '../../shared/plan/stick/spoken';
import { loadText } from '../data/api-client';
import { keys } from '../data/query-client';
import { Heading } from '../ui/heading';
import { LoadingLines } from '../ui/states';
import { PressArea } from '../ui/pressable';
import { Text } from '../ui/text';
import { colour } from '../ui/tokens';
import { webStyle } from '../ui/web-style';
import { type ClipPlace } from './clip-place';

const none: readonly Cue[] = [];

/** The captions of a clip by their hash; empty until they are there. */
export function useCues(hash: string | undefined): { cues: readonly Cue[]; missing: boolean } {
  const query = useQuery({
    queryKey: keys.captions(hash ?? 'none'),
    queryFn: () => loadText(mediaPath(hash ?? '', 'original')),
    enabled: hash !== undefined,
    staleTime: Infinity,
  });
  const cues = useMemo(() => (query.data ? readCaptions(query.data).cues : none), [query.data]);
  return { cues, missing: query.data === null };
}

/** The captions in step with the clip: the current one is marked, a press goes there. */
export function CaptionsList({
  cues,
  missing,
  place,
}: {
  cues: readonly Cue[];
  missing: boolean;
  place: ClipPlace;
}) {
  const at = cues.findLastIndex((cue) => cue.start <= place.now + 0.05);
  const list = useRef<View>(null);
  useEffect(() => {
    const element = list.current as unknown as HTMLElement | null;
    const line = element?.querySelector<HTMLElement>('[data-now="yes"]');
    if (element && line) element.scrollTop = line.offsetTop - element.clientHeight / 3;
  }, [at]);
  if (missing)
    return <Text tone="ink2">The captions did not come. They are kept; load the page again.</Text>;
  if (cues.length === 0) return <LoadingLines label="Loading the captions" />;
  return (
    <>
      <Heading level={2} note={`${cues.length}`}>
        Captions
      </Heading>
      <View ref={list} role="list" aria-label="Captions" tabIndex={0} style={styles.list}>
        {cues.map((cue, i) => (
          <View
            key={`${cue.start}-${i}`}
            role="listitem"
            dataSet={{ now: i === at ? 'yes' : 'no' }}
          >
            <PressArea
              role="button"
              label={`Go to ${clockTime(cue.start)}: ${cue.text}`}
              onPress={() => place.goTo(cue.start)}
              style={[styles.cue, i === at && styles.now]}
            >
              <Text size="note" mono tone={i === at ? 'blue' : 'ink2'}>
                {clockTime(cue.start)}
              </Text>
              <Text size="note" style={styles.words}>
                {cue.text}
              </Text>
            </PressArea>
          </View>
        ))}
      </View>
    </>
  );
}

const styles = StyleSheet.create({
  list: webStyle({ maxHeight: 360, overflowY: 'auto', position: 'relative' }),
  cue: webStyle({
    display: 'flex',
    flexDirection: 'row',
    gap: 12,
    padding: '6px 8px',
    minHeight: 36,
    cursor: 'pointer',
  }),
  now: { backgroundColor: colour.blueWash },
  words: { flex: 1 },
});
