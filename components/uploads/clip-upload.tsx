import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect, useState, useSyncExternalStore } from 'react';
import { limits } from '../../shared/api/limits';
import { listUploads, type Upload } from '../../shared/api/uploads';
import { call } from '../data/api-client';
import {
  clearSending,
  giveClipUp,
  pauseClip,
  resumeClip,
  sendClip,
  sendingStore,
  type Sending,
} from '../data/clip-upload';
import { tell } from '../data/problems';
import { keys } from '../data/query-client';
import { sizeWords } from '../service-worker/size-words';
import { Banner } from '../ui/banner';
import { Button } from '../ui/button';
import { FilePick } from '../ui/file-pick';
import { Row, Stack } from '../ui/layout';
import { Progress } from '../ui/progress';
import { Text } from '../ui/text';

export interface ArrivedClip {
  hash: string;
  /** Seconds; null when the file does not say. */
  duration: number | null;
}

export interface ClipUploadProps {
  planId: string;
  /** The clip the draft has. */
  hash: string | undefined;
  onArrived: (clip: ArrivedClip) => void;
}

/** Takes a clip of up to 4 GB: sends it in parts, goes on after a reload, pauses, gives up, says what goes on. */
export function ClipUpload({ planId, hash, onArrived }: ClipUploadProps) {
  const sending = useSyncExternalStore(
    sendingStore.subscribe,
    () => sendingStore.of(planId),
    () => sendingStore.of(planId),
  );
  const [trouble, setTrouble] = useState<string | null>(null);
  const open = useOpenUploads(planId, sending.at);
  useEffect(() => {
    if (sending.at !== 'done') return;
    onArrived(sending);
    clearSending(planId);
  }, [sending, planId, onArrived]);
  const giveUp = (id?: string) => {
    setTrouble(null);
    giveClipUp(planId, id).catch((error: unknown) => setTrouble(tell(error).text));
    void open.refetch();
  };
  return (
    <Stack gap={12}>
      {trouble ? <Banner kind="fails">{trouble}</Banner> : null}
      <SendingLine planId={planId} sending={sending} onGiveUp={() => giveUp()} />
      {sending.at === 'none'
        ? open.items.map((upload) => (
            <Before
              key={upload.id}
              upload={upload}
              used={upload.hash === hash}
              onUse={onArrived}
              onGiveUp={() => giveUp(upload.id)}
            />
          ))
        : null}
      <FilePick
        label="Clip file"
        accept="video/*"
        maxBytes={limits.clipBytes}
        disabled={sending.at !== 'none' && sending.at !== 'stopped'}
        onFiles={([file]) => {
          setTrouble(null);
          if (file) void sendClip(planId, file);
        }}
      />
    </Stack>
  );
}

/** Uploads for this draft from before this page was loaded. */
function useOpenUploads(planId: string, at: Sending['at']) {
  const client = useQueryClient();
  const query = useQuery({
    queryKey: keys.uploads,
    queryFn: ({ signal }) => call(listUploads, { signal }),
    staleTime: 0,
    enabled: at === 'none',
    refetchInterval: ({ state }) =>
      state.data?.items.some((u) => u.state === 'waiting' || u.state === 'working') ? 1500 : false,
  });
  const items = (query.data?.items ?? []).filter((upload) => upload.planId === planId);
  return { items, refetch: () => client.invalidateQueries({ queryKey: keys.uploads }) };
}

interface BeforeProps {
  upload: Upload;
  used: boolean;
  onUse: (clip: ArrivedClip) => void;
  onGiveUp: () => void;
}

/** An upload from before a reload: how far it came, and how it goes on. */
function Before({ upload, used, onUse, onGiveUp }: BeforeProps) {
  const { name, state, bytes, parts, hash, duration, reason } = upload;
  if (state === 'open') {
    const there = parts.reduce((sum, part) => sum + part.bytes, 0);
    return (
      <Banner kind="note" action={{ label: 'Give it up', onPress: onGiveUp }}>
        {`“${name}” broke off; ${sizeWords(there)} of ${sizeWords(bytes)} are here. Choose the same file again and it goes on from there.`}
      </Banner>
    );
  }
  if (state === 'done')
    return used || !hash ? null : (
      <Banner
        kind="note"
        action={{ label: `Use ${name}`, onPress: () => onUse({ hash, duration }) }}
      >
        {`“${name}” has arrived.`}
      </Banner>
    );
  if (state === 'refused' || state === 'failed')
    return (
      <Banner kind="fails" action={{ label: 'Put it away', onPress: onGiveUp }}>
        {`“${name}” was not taken. ${reason ?? ''}`}
      </Banner>
    );
  return (
    <Text role="status" tone="ink2">
      {`“${name}” has arrived and is being looked into.`}
    </Text>
  );
}

interface SendingLineProps {
  planId: string;
  sending: Sending;
  onGiveUp: () => void;
}

function SendingLine({ planId, sending, onGiveUp }: SendingLineProps) {
  if (sending.at === 'none' || sending.at === 'done') return null;
  if (sending.at === 'looking')
    return (
      <Text role="status" tone="ink2">
        {`“${sending.name}” has arrived and is being looked into.`}
      </Text>
    );
  const again = () => resumeClip(planId);
  if (sending.at === 'stopped')
    return (
      <Banner kind="fails" action={{ label: 'Try again', onPress: again }}>
        {`“${sending.name}”: ${sending.reason}`}
      </Banner>
    );
  const { name, sent, bytes, at } = sending;
  const share = bytes > 0 ? sent / bytes : 0;
  const far = `${sizeWords(sent)} of ${sizeWords(bytes)}`;
  const words = {
    sending: `Uploading “${name}”: ${far}. You can go on meanwhile.`,
    paused: `“${name}” is paused: ${far} are here.`,
    'no-signal': `No signal. “${name}” goes on by itself when it is back: ${far} are here.`,
  } as const;
  return (
    <Stack gap={8}>
      <Text tone="ink2">{words[at]}</Text>
      <Progress label={`Uploading ${name}`} value={share} />
      <Row gap={12} wrap>
        {at === 'paused' ? (
          <Button label="Go on uploading" onPress={again} />
        ) : (
          <Button label="Pause" onPress={() => pauseClip(planId)} />
        )}
        <Button label="Give the upload up" onPress={onGiveUp} />
      </Row>
    </Stack>
  );
}
