/** The keep of this browser: IndexedDB, or only memory when the browser refuses that (a private window). */
import type { Keep } from './keep.ts';
import { openLastingKeep } from './lastingKeep.ts';
import { PassingKeep } from './passingKeep.ts';

/** Milliseconds after which a browser that does not answer counts as refusing. */
const PATIENCE = 3000;

/** With what ended pages had only jotted down taken in. Never rejects. */
export async function openKeep(): Promise<Keep> {
  try {
    const keep = await withPatience(openLastingKeep());
    await takeInJotted(keep);
    return keep;
  } catch {
    return new PassingKeep();
  }
}

async function withPatience<T>(promise: Promise<T>): Promise<T> {
  let timer: ReturnType<typeof setTimeout>;
  const patience = new Promise<never>((_, reject) => {
    timer = setTimeout(() => reject(new Error('no answer')), PATIENCE);
  });
  return Promise.race([promise, patience]).finally(() => clearTimeout(timer));
}

async function takeInJotted(keep: Keep): Promise<void> {
  for (const { craft, known } of await keep.jotted()) {
    const kept = await keep.craft(craft.id);
    if (!kept || kept.changedAt <= craft.changedAt) await keep.put(craft, known);
    await keep.unjot(craft);
  }
}
