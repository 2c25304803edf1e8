import { useEffect, useRef } from 'react';

/** Sounds and shakes once each time `on` becomes true. The screen shows the same in words and shape. */
export function useSignal(on: boolean, toneHz: number): void {
  const was = useRef(false);
  useEffect(() => {
    if (on && !was.current) {
      navigator.vibrate?.([300, 150, 300]);
      beep(toneHz);
    }
    was.current = on;
  }, [on, toneHz]);
}

function beep(toneHz: number): void {
  if (!('AudioContext' in window)) return;
  const audio = new AudioContext();
  const tone = audio.createOscillator();
  const volume = audio.createGain();
  tone.frequency.value = toneHz;
  volume.gain.value = 0.4;
  tone.connect(volume).connect(audio.destination);
  tone.start();
  tone.stop(audio.currentTime + 0.6);
  tone.onended = () => void audio.close();
}
