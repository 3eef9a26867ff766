/**
 * The plans put by for a craft, as they are kept between visits. They stand apart from the record of the craft, so that
 * a page that only looks at the craft takes none of them away.
 */
import { stowageFrom } from '../craft/stowageSchema.ts';
import { type KeptPlan, MOST_KEPT } from '../panels/plan/planning.ts';
import type { Keep } from './keep.ts';
import { plansSetting } from './kept.ts';

/** Never rejects: what cannot be read is as if it had not been kept. */
export async function keptPlans(keep: Pick<Keep, 'setting'>, craftId: string): Promise<readonly KeptPlan[]> {
  const kept = await keep.setting(plansSetting(craftId)).catch(() => null);
  return Array.isArray(kept) ? kept.flatMap(planFrom).slice(0, MOST_KEPT) : [];
}

function planFrom(kept: unknown): KeptPlan[] {
  const { number, robust, stowage } = (kept ?? {}) as Record<string, unknown>;
  const read = stowageFrom(stowage);
  return read && typeof number === 'number' && typeof robust === 'boolean'
    ? [{ number, robust, stowage: read }]
    : [];
}

export const putKeptPlans = (
  keep: Pick<Keep, 'putSetting'>,
  craftId: string,
  plans: readonly KeptPlan[],
): Promise<void> => keep.putSetting(plansSetting(craftId), plans);
