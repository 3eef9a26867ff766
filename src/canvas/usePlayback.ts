/** Time that runs while something is played, as fast as on the clock, and stands at its end. */
import { useEffect, useState } from 'react';

export interface Playback {
  /** s */
  readonly time: number;
  readonly playing: boolean;
  /** From where it stands; from the start when it stands at the end. */
  play(): void;
  pause(): void;
  seek(time: number): void;
}

/** Who asked for little motion sees still pictures, so far apart, s. */
const STILL_STEP = 0.5;
const LITTLE_MOTION = '(prefers-reduced-motion: reduce)';

/** `duration` in s; may change while it plays. */
export function usePlayback(duration: number): Playback {
  const [at, setAt] = useState(0);
  const [playing, setPlaying] = useState(false);
  const time = Math.min(at, duration);
  useEffect(() => {
    if (!playing) return;
    const step = matchMedia(LITTLE_MOTION).matches ? STILL_STEP : 0;
    return frames((gone) => {
      setAt((last) => Math.min(last + gone, duration));
    }, step);
  }, [playing, duration]);
  useEffect(() => {
    if (playing && time >= duration) setPlaying(false);
  }, [playing, time, duration]);
  return {
    time,
    playing,
    play: () => {
      if (time >= duration) setAt(0);
      setPlaying(duration > 0);
    },
    pause: () => setPlaying(false),
    seek: (to) => {
      setPlaying(false);
      setAt(to);
    },
  };
}

/** Calls back at each frame, or once `step` seconds have gone, with the seconds gone since; returns how to stop. */
function frames(tick: (gone: number) => void, step: number): () => void {
  let last: number | null = null;
  let handle = requestAnimationFrame(function frame(now) {
    last ??= now;
    const gone = (now - last) / 1000;
    if (gone > 0 && gone >= step) {
      last = now;
      tick(gone);
    }
    handle = requestAnimationFrame(frame);
  });
  return () => cancelAnimationFrame(handle);
}
