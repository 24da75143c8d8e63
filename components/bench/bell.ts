let context: AudioContext | undefined;

/** To be called from a press: browsers sound, and ask for notices, only after one. */
export function armBell(): void {
  try {
    context ??= new AudioContext();
    void context.resume();
  } catch {
    // No sound here; the screen still says it.
  }
  if ('Notification' in window && Notification.permission === 'default')
    void Notification.requestPermission().catch(() => undefined);
}

/** Three strokes of two tones, about two seconds. */
function sound(): void {
  if (!context || context.state !== 'running') return;
  for (let i = 0; i < 3; i += 1) {
    const at = context.currentTime + i * 0.7;
    const gain = context.createGain();
    gain.gain.setValueAtTime(0.0001, at);
    gain.gain.exponentialRampToValueAtTime(0.5, at + 0.02);
    gain.gain.exponentialRampToValueAtTime(0.0001, at + 0.6);
    gain.connect(context.destination);
    for (const tone of [880, 1320]) {
      const oscillator = context.createOscillator();
      oscillator.frequency.value = tone;
      oscillator.connect(gain);
      oscillator.start(at);
      oscillator.stop(at + 0.65);
    }
  }
}

async function notice(words: string, tag: string): Promise<void> {
  if (!('Notification' in window) || Notification.permission !== 'granted') return;
  const worker = await navigator.serviceWorker?.getRegistration();
  const options = { tag, body: 'Scantling', requireInteraction: true };
  // Phones show notices through the worker only.
  if (worker) await worker.showNotification(words, options);
  else new Notification(words, options);
}

/** Rings by sound, by a shake and by a notice, as far as this device lets it. */
export function ring(words: string, tag: string): void {
  sound();
  if ('vibrate' in navigator) navigator.vibrate([500, 200, 500, 200, 500]);
  void notice(words, tag).catch(() => undefined);
}
