/** The words for how lead comes at a hardpoint. */
import type { Fill } from '../../craft/planningSchema.ts';
import { type Choice, choicesOf } from '../words.ts';

export const FILL_WORDS: Readonly<Record<Fill, string>> = {
  continuous: 'Cut to measure',
  pieces: 'In pieces at hand',
};

export const FILL_CHOICES: readonly Choice<Fill>[] = choicesOf(['continuous', 'pieces'], FILL_WORDS);
