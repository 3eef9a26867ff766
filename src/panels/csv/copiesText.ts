/** How many pieces a part has, in one cell: "3", "pair", "ring 3". */
import type { Copies } from '../../craft/schema.ts';
import type { Read } from '../fields/entry.ts';

export const copiesText = (copies: Copies): string =>
  copies.kind === 'pair' ? 'pair' : copies.kind === 'ring' ? `ring ${copies.count}` : String(copies.count);

export function readCopies(text: string): Read<Copies> {
  const plain = text.trim().toLowerCase();
  if (plain === '') return { ok: true, value: { kind: 'together', count: 1 } };
  if (plain === 'pair') return { ok: true, value: { kind: 'pair' } };
  const ring = /^ring (?:of )?(\d{1,3})$/.exec(plain);
  if (ring) return { ok: true, value: { kind: 'ring', count: Number(ring[1]) } };
  if (/^\d{1,3}$/.test(plain)) return { ok: true, value: { kind: 'together', count: Number(plain) } };
  return {
    ok: false,
    message: `Found “${text.trim()}”; allowed: a whole number, pair, or ring and a whole number.`,
  };
}
