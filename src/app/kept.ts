/** What is kept of a craft between visits, and which of its earlier texts stay at hand. */

/** How the page looked at the craft. */
export interface KeptView {
  readonly tilted: boolean;
  /** Which panel was in front. */
  readonly tab: string;
}

export interface KeptCraft {
  readonly id: string;
  readonly name: string;
  /** Milliseconds since 1970. */
  readonly changedAt: number;
  /** The craft file. */
  readonly text: string;
  readonly view: KeptView;
  /** Which page wrote it; two tabs have two names. */
  readonly writer: string;
}

export type KeptVersion = Pick<KeptCraft, 'name' | 'changedAt' | 'text' | 'writer'>;

export interface Merged {
  readonly craft: KeptCraft;
  /** Newest first. */
  readonly versions: readonly KeptVersion[];
  /** Another page had changed the craft; what it wrote is now the newest version. */
  readonly displaced: boolean;
}

/** The setting under which the plans put by for a craft are kept. */
export const plansSetting = (craftId: string): string => `plans ${craftId}`;

export const MOST_VERSIONS = 10;
/** Within this many milliseconds one page's earlier texts count as one version. */
export const VERSION_SPAN = 120_000;

/**
 * What is kept once `next` comes in. `known` is the text the page last read or wrote: when `before` is another one,
 * a second page has been at work. When `next` brings no new text, only the view is taken from it.
 */
export function merge(
  versions: readonly KeptVersion[],
  before: KeptCraft | undefined,
  next: KeptCraft,
  known: string | null,
): Merged {
  if (!before) return { craft: next, versions, displaced: false };
  if (next.text === before.text || next.text === known) {
    return { craft: { ...before, view: next.view }, versions, displaced: false };
  }
  const displaced = before.text !== known;
  return { craft: next, versions: withVersion(versions, before, displaced), displaced };
}

function withVersion(
  versions: readonly KeptVersion[],
  before: KeptCraft,
  displaced: boolean,
): readonly KeptVersion[] {
  const sameHand = versions.find(({ writer }) => writer === before.writer);
  const recent = sameHand !== undefined && before.changedAt - sameHand.changedAt < VERSION_SPAN;
  if (recent && !displaced) return versions;
  // Tabs that take turns replace their own last version instead of pushing out the older ones.
  const others = recent ? versions.filter((version) => version !== sameHand) : versions;
  return [versionOf(before), ...others].slice(0, MOST_VERSIONS);
}

const versionOf = ({ name, changedAt, text, writer }: KeptCraft): KeptVersion => ({
  name,
  changedAt,
  text,
  writer,
});

export const newestFirst = (crafts: readonly KeptCraft[]): readonly KeptCraft[] =>
  [...crafts].sort((a, b) => b.changedAt - a.changedAt);
