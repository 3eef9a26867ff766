/** A plain word on figures whose name alone does not say enough, by key. */
export const FIGURE_HINTS: Readonly<Record<string, string>> = {
  'mass.solid': 'Everything that weighs: film, seams, patches, parts and wire runs. The gas is not in it.',
  heaviness: 'Solid mass less gross lift: above zero it sinks, below zero it rises.',
  'float.heel': 'How far it leans over to one side; even means not at all.',
  'float.pendulumDepth': 'How far the CG hangs below the CB. The deeper, the more firmly it stands upright.',
  'lead.degreesPerGram': 'How far the next gram at the chosen hardpoint turns the craft in pitch.',
  'oneWeight.mass': 'One weight that makes the craft level and neutral at once.',
};

/** The same for the verdicts. */
export const VERDICT_HINTS: Readonly<Record<string, string>> = {
  floats: 'Whether it is as heavy or light as wanted',
  level: 'Whether nose and tail are at one height, within the pitch tolerance',
  upright: 'Whether the CG hangs well below the CB',
  even: 'Whether it leans to neither side, within the heel tolerance',
  lead: 'The least lead at the chosen hardpoint that levels it',
};
