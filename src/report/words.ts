/** Words that several sentences of the report share; quantities by `say`. */
import { say } from '../units/sentence.ts';
import { insignificant } from './rows.ts';

/** "12.0 g light", "3.0 g heavy", "neutral". */
export const heavinessWords = (heaviness: number): string =>
  insignificant(heaviness, 'mass')
    ? 'neutral'
    : `${say(Math.abs(heaviness), 'mass')} ${heaviness > 0 ? 'heavy' : 'light'}`;
