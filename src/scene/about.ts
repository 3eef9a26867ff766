/** What a thing under the pointer is: its name, mass, arm and moment. */
import type { BeamBar } from '../report/assessment.ts';
import { formatQuantity } from '../units/format.ts';
import type { Grip } from './grip.ts';
import { insideLines } from './insideLines.ts';
import type { Readout } from './readout.ts';
import { geometryOf, type Subject } from './subject.ts';
import { thrustReadout } from './thrustWords.ts';
import { leadWords, momentAmount, momentWords, nameOfGrip } from './words.ts';

/** Null for the handles of the hull, which name themselves by moving. */
export function aboutGrip(subject: Subject, grip: Grip): Readout | null {
  const geometry = geometryOf(subject.assessment);
  if (!geometry) return null;
  const title = nameOfGrip(subject.craft, grip);
  switch (grip.kind) {
    case 'part':
    case 'wire': {
      const bar = geometry.beam.find(({ kind, id }) => kind === grip.kind && id === grip.id);
      const about = bar ? aboutBar(subject, bar) : { title, lines: [] };
      return { ...about, lines: [...about.lines, ...insideLines(subject, geometry, grip)] };
    }
    case 'wireEnd':
      return { title, lines: ['Drag it onto a part to join it'] };
    case 'hardpoint':
      return { title, lines: aboutHardpoint(subject, grip.id) };
    case 'support':
      return { title, lines: ['Carries the static heaviness'] };
    case 'thrust':
      return thrustReadout(subject, grip.id, grip.way);
    case 'hull':
      return null;
  }
}

/** The same on one line, for a low pane. */
export const aboutBarShort = (subject: Subject, bar: BeamBar): Readout => ({
  title: aboutBar(subject, bar).title,
  lines: [momentWords(bar.mass, bar.station - (geometryOf(subject.assessment)?.cb[0] ?? 0), subject.units)],
});

/** "Battery": mass, arm from the CB, moment. */
export function aboutBar({ assessment, units }: Subject, bar: BeamBar): Readout {
  const cb = geometryOf(assessment)?.cb[0] ?? 0;
  const arm = bar.station - cb;
  const way = arm < 0 ? 'forward of CB' : 'aft of CB';
  return {
    title: bar.kind === 'lead' ? `Lead at ${bar.name || 'the hardpoint'}` : bar.name,
    lines: [
      `mass ${formatQuantity(bar.mass, 'mass', units)}`,
      `arm ${formatQuantity(Math.abs(arm), 'length', units)} ${way}`,
      `moment ${momentAmount(bar.moment, units)} ${bar.moment < 0 ? 'nose-down' : 'tail-down'}`,
    ],
  };
}

function aboutHardpoint(subject: Subject, id: string): string[] {
  const at = geometryOf(subject.assessment)?.hardpoints.find(({ hardpoint }) => hardpoint === id)?.at;
  const lead = subject.craft.leadAt === id ? leadWords(subject) : null;
  return [
    ...(at ? [`hardpoint at station ${formatQuantity(at[0], 'length', subject.units)}`] : ['hardpoint']),
    ...(lead ? [lead] : []),
  ];
}
