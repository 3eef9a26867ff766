/** What the report advises, as edits: one step each. */
import type { Craft } from '../craft/craft.ts';
import { type Edit, step } from '../edit/edit.ts';
import { addPart, placePart } from '../edit/edits/parts.ts';
import type { Advice } from '../report/advice.ts';
import type { Assessment } from '../report/assessment.ts';
import type { VerdictKey } from '../report/verdict.ts';
import { blankPart } from './defaults.ts';

export type AdviceKind = Advice['kind'];

export const adviceOf = ({ advice }: Assessment, kind: AdviceKind): Advice | null =>
  advice.find((each) => each.kind === kind) ?? null;

/** What the sentence on top speaks of: the lead and the slide once it is neither top-heavy nor too heavy, the load once all else is met. */
export function headlineAdvice(assessment: Assessment, { targets }: Pick<Craft, 'targets'>): AdviceKind[] {
  const value = (key: string) => assessment.rows[key]?.value ?? null;
  const [depth, heaviness] = [value('float.pendulumDepth'), value('heaviness')];
  if ((depth !== null && depth <= 0) || (heaviness !== null && heaviness > targets.heaviness.most)) return [];
  const has = (kind: AdviceKind) => adviceOf(assessment, kind) !== null;
  const met = (key: VerdictKey) => assessment.verdicts.find((each) => each.key === key)?.state === 'met';
  if (!met('level')) return (['lead', 'slide'] as const).filter(has);
  const onlyLight = met('even') && met('upright') && !met('floats');
  return onlyLight ? (['load'] as const).filter(has) : [];
}

export function adviceEdit(advice: Advice): Edit {
  switch (advice.kind) {
    case 'lead':
      return addPart({
        ...blankPart(advice.place),
        kind: 'ballast',
        name: `Lead at ${advice.name}`,
        mass: advice.mass,
        size: { length: 0.04, width: 0.03, height: 0.02 },
      });
    case 'load':
      return addPart({ ...blankPart(advice.place), name: 'Load', mass: advice.mass });
    case 'slide':
      return step(`Slide ${advice.name}`, placePart(advice.part, advice.place));
  }
}
