import * as Speech from 'expo-speech';
import { useEffect, useState } from 'react';
import { IconButton } from '../ui/icon-button';

/** Whether this browser has a voice to read with; false until it says so. */
function useVoice(): boolean {
  const [there, setThere] = useState(false);
  useEffect(() => {
    const synthesis = (window as { speechSynthesis?: SpeechSynthesis }).speechSynthesis;
    if (!synthesis) return;
    const look = () => setThere(synthesis.getVoices().length > 0);
    look();
    // Chromium tells its voices only after a while.
    synthesis.addEventListener('voiceschanged', look);
    return () => synthesis.removeEventListener('voiceschanged', look);
  }, []);
  return there;
}

/** Reads aloud, sentence by sentence, and stops when it goes away (give each step its own). Not there without a voice. */
export function ReadAloud({ sentences }: { sentences: () => readonly string[] }) {
  const voice = useVoice();
  const [on, setOn] = useState(false);
  useEffect(() => () => void Speech.stop(), []);
  if (!voice) return null;
  const stop = () => {
    void Speech.stop();
    setOn(false);
  };
  const read = () => {
    void Speech.stop();
    setOn(true);
    const all = sentences();
    all.forEach((text, i) => {
      const last = i === all.length - 1;
      Speech.speak(text, {
        language: 'en',
        rate: 0.95,
        ...(last ? { onDone: () => setOn(false) } : {}),
      });
    });
  };
  return (
    <IconButton
      kind="bare"
      size="bench"
      icon="aloud"
      label={on ? 'Stop reading aloud' : 'Read this step aloud'}
      pressed={on}
      onPress={on ? stop : read}
    />
  );
}
