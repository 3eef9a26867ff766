/** The craft and its figures as rows of the ledger. */
import { type Craft, listed } from '../../craft/craft.ts';
import type { WireEnd } from '../../craft/schema.ts';
import type { Assessment, BeamBar } from '../../report/assessment.ts';
import { PART_WORDS } from '../words.ts';
import type { HardpointRow } from './hardpointColumns.tsx';
import type { PartRow } from './partColumns.tsx';
import type { WireRow } from './wireColumns.tsx';

const barsOf = ({ geometry }: Assessment, kind: BeamBar['kind']): Map<string, BeamBar> =>
  new Map(
    geometry.status === 'solved'
      ? geometry.beam.filter((bar) => bar.kind === kind).map((bar) => [bar.id, bar])
      : [],
  );

export function partRows(craft: Craft, assessment: Assessment): PartRow[] {
  const bars = barsOf(assessment, 'part');
  return listed(craft.parts).map((part) => ({
    id: part.id,
    name: part.name || PART_WORDS[part.kind],
    part,
    moment: bars.get(part.id)?.moment ?? null,
  }));
}

export function wireRows(craft: Craft, assessment: Assessment): WireRow[] {
  const bars = barsOf(assessment, 'wire');
  const { geometry } = assessment;
  const views = new Map(geometry.status === 'solved' ? geometry.wires.map((view) => [view.wire, view]) : []);
  return listed(craft.wires).map((wire) => ({
    id: wire.id,
    name: wire.name || 'Wire run',
    wire,
    from: endText(craft, wire.from),
    to: endText(craft, wire.to),
    length: views.get(wire.id)?.length ?? null,
    mass: views.get(wire.id)?.mass ?? null,
    moment: bars.get(wire.id)?.moment ?? null,
  }));
}

function endText(craft: Craft, end: WireEnd): string {
  if (end.kind === 'loose') return 'Loose';
  const { name, kind } = craft.parts.byId[end.part]!;
  return name || PART_WORDS[kind];
}

export const hardpointRows = (craft: Craft): HardpointRow[] =>
  listed(craft.hardpoints).map((hardpoint) => ({
    id: hardpoint.id,
    name: hardpoint.name || 'Hardpoint',
    hardpoint,
    lead: craft.leadAt === hardpoint.id,
  }));
