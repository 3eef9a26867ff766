/** Keeps what did not change as the very same objects, so that a view redraws only what did. */
import type { Craft } from '../craft/craft.ts';
import type { Part } from '../craft/schema.ts';
import type { Hull, PieceView, Vec3, WireView } from '../report/assessment.ts';
import type { Figure } from './figure.ts';
import type { Geometry } from './subject.ts';

/** `next` with earlier elements in place of equal ones; `before` itself when all are. */
export function keepSame<T>(
  before: readonly T[],
  next: readonly T[],
  same: (a: T, b: T) => boolean,
): readonly T[] {
  const kept = next.map((item, i) => {
    const old = before[i];
    return old !== undefined && same(old, item) ? old : item;
  });
  return kept.length === before.length && kept.every((item, i) => item === before[i]) ? before : kept;
}

export const sameVector = (a: Vec3, b: Vec3): boolean => a[0] === b[0] && a[1] === b[1] && a[2] === b[2];

export const sameWire = (a: WireView, b: WireView): boolean =>
  a.wire === b.wire &&
  a.branches.length === b.branches.length &&
  a.branches.every((branch, i) => sameLine(branch, b.branches[i]!));

const sameLine = (a: readonly Vec3[], b: readonly Vec3[]): boolean =>
  a.length === b.length && a.every((point, i) => sameVector(point, b[i]!));

export type FigureMaker = (part: Part, piece: PieceView, hull: Hull, px: number) => Figure;

interface Kept {
  readonly part: Part;
  readonly piece: PieceView;
  readonly hull: Hull;
  readonly px: number;
  readonly figure: Figure;
}

/** Figures of all pieces; a piece that is as it was has the figure it had. */
export class FigureCache {
  #kept = new Map<string, Kept>();
  readonly #make: FigureMaker;

  constructor(make: FigureMaker) {
    this.#make = make;
  }

  /** `px` is the size of a pixel, m. */
  figures(craft: Craft, { hull, pieces }: Geometry, px: number): Figure[] {
    const kept = new Map<string, Kept>();
    const figures = pieces.flatMap((piece) => {
      const part = craft.parts.byId[piece.part];
      if (!part) return [];
      const key = `${piece.part} ${piece.copy}`;
      const entry = this.#still(key, part, piece, hull, px) ?? {
        part,
        piece,
        hull,
        px,
        figure: this.#make(part, piece, hull, px),
      };
      kept.set(key, entry);
      return [entry.figure];
    });
    this.#kept = kept;
    return figures;
  }

  #still(key: string, part: Part, piece: PieceView, hull: Hull, px: number): Kept | null {
    const old = this.#kept.get(key);
    const still =
      old &&
      old.part === part &&
      old.hull === hull &&
      old.px === px &&
      old.piece.roll === piece.roll &&
      sameVector(old.piece.middle, piece.middle);
    return still ? old : null;
  }
}
