/** How every figure comes about: its formula, the figures that go in, and the source. Shown when a figure is opened. */
import type { Rows } from './rows.ts';
import type { Working } from './verdict.ts';

interface Recipe {
  readonly formula: string;
  readonly from: readonly string[];
  readonly source: string;
}

const HULL =
  'The hull form as entered, turned about its axis; elementary calculus (Pappus). Sources of each form stand in its file.';
const MOMENTS = 'Weight and balance by moments, FAA-H-8083-1.';
const HANG = 'At rest the line from CG to CB stands vertical; moments about the CB.';

const RECIPES: Readonly<Record<string, Recipe>> = {
  'hull.length': { formula: 'nose tip to tail tip', from: [], source: HULL },
  'hull.diameter': { formula: '2 × greatest distance of the skin from the axis', from: [], source: HULL },
  'hull.fineness': {
    formula: 'length ÷ greatest height',
    from: ['hull.length', 'hull.diameter'],
    source: 'Definition.',
  },
  'hull.volume': { formula: '∫ section area dx', from: ['hull.length', 'hull.diameter'], source: HULL },
  'hull.area': { formula: '∫ girth ds along the skin', from: ['hull.length', 'hull.diameter'], source: HULL },
  'hull.filmArea': {
    formula: 'wetted area, or the area of the flat sheets it is made from',
    from: ['hull.area'],
    source: HULL,
  },
  'hull.cbStation': {
    formula: '∫ x · section area dx ÷ gas volume',
    from: ['hull.volume'],
    source: 'Centroid of the gas volume.',
  },
  'hull.skinStation': {
    formula: '∫ x · film width ds ÷ film area',
    from: ['hull.filmArea'],
    source: 'Centroid of the film.',
  },
  'hull.filmMass': {
    formula: 'areal density × film area',
    from: ['hull.filmArea'],
    source: 'The film as entered.',
  },
  'hull.seamMass': {
    formula: 'seams × mass per length × length of a seam',
    from: ['hull.length'],
    source: 'The seams as entered.',
  },
  'hull.skinMass': {
    formula: 'film + seams + patches',
    from: ['hull.filmMass', 'hull.seamMass'],
    source: 'Sum.',
  },
  'air.pressure': {
    formula: 'as measured; or from QNH and elevation; or of the standard atmosphere',
    from: [],
    source: 'ICAO Standard Atmosphere; US Standard Atmosphere 1976.',
  },
  'air.density': {
    formula: 'p M / (Z R T), moist air',
    from: ['air.pressure'],
    source: 'CIPM-2007 (Picard et al. 2008), or the US Standard Atmosphere 1976.',
  },
  'gas.density': {
    formula: '(p + gauge pressure) M / (R (T + superheat))',
    from: ['air.pressure'],
    source: 'Ideal gas; molar mass by volume fractions.',
  },
  'gas.mass': {
    formula: 'gas density × gas volume',
    from: ['gas.density', 'hull.volume'],
    source: 'Definition.',
  },
  'lift.gross': {
    formula: '(air density − gas density) × gas volume',
    from: ['air.density', 'gas.density', 'hull.volume'],
    source: 'Archimedes.',
  },
  'lift.left': {
    formula: 'gross lift − solid mass',
    from: ['lift.gross', 'mass.solid'],
    source: 'Definition.',
  },
  'mass.solid': {
    formula: 'skin + parts + wire runs',
    from: ['hull.skinMass'],
    source: 'Sum; tolerances by JCGM 100.',
  },
  heaviness: {
    formula: 'solid mass − gross lift, + heavy',
    from: ['mass.solid', 'lift.gross'],
    source: 'Definition.',
  },
  'cg.station': { formula: 'Σ mass × station ÷ Σ mass', from: ['mass.solid'], source: MOMENTS },
  'cg.side': { formula: 'Σ mass × side ÷ Σ mass', from: ['mass.solid'], source: MOMENTS },
  'cg.height': { formula: 'Σ mass × height ÷ Σ mass', from: ['mass.solid'], source: MOMENTS },
  'float.pitch': {
    formula: 'atan2(CG station − CB station, CB height − CG height), + nose-up',
    from: ['cg.station', 'hull.cbStation', 'cg.height'],
    source: HANG,
  },
  'float.heel': {
    formula: 'atan2(CG side, CB height − CG height), + starboard down',
    from: ['cg.side', 'cg.height'],
    source: HANG,
  },
  'float.pendulumDepth': {
    formula: 'CB height − CG height; the CB is on the axis',
    from: ['cg.height'],
    source: 'Definition.',
  },
  'float.rightingMoment': {
    formula: 'solid mass × g × pendulum depth, for small turns',
    from: ['mass.solid', 'float.pendulumDepth'],
    source: 'Statics of a hanging body.',
  },
  'float.swingPeriod': {
    formula: '2π √(J ÷ (W g h)), J = I_CB + I_gas + k′ I_air − (W h)² ÷ (W + m_gas + k₁ m_air)',
    from: ['mass.solid', 'float.pendulumDepth', 'gas.mass', 'air.density', 'hull.volume'],
    source: 'Lagrange’s equations for small swings; added mass after Lamb, Hydrodynamics (1932), §§ 114–124.',
  },
  'lead.mass': {
    formula: 'solid mass × (CG station − CB station) ÷ (CB station − lead station)',
    from: ['mass.solid', 'cg.station', 'hull.cbStation', 'lead.station'],
    source: 'Permanent ballast, FAA-H-8083-1.',
  },
  'lead.massWithinTolerance': {
    formula: 'least mass with which |pitch| is within the tolerance',
    from: ['float.pitch', 'lead.station'],
    source: 'Moments about the CB; smaller root of the quadratic.',
  },
  'lead.station': { formula: 'where the chosen hardpoint is', from: [], source: 'The craft as entered.' },
  'lead.degreesPerGram': {
    formula: 'd pitch ÷ d mass at the hardpoint',
    from: ['mass.solid', 'cg.station', 'cg.height', 'lead.station'],
    source: HANG,
  },
  'lead.heavinessAfter': {
    formula: 'static heaviness + lead',
    from: ['heaviness', 'lead.mass'],
    source: 'Sum.',
  },
  'lead.pendulumDepthAfter': {
    formula: 'pendulum depth with the lead on',
    from: ['float.pendulumDepth', 'lead.mass'],
    source: MOMENTS,
  },
  'oneWeight.mass': { formula: 'all the lift left', from: ['lift.left'], source: 'Definition.' },
  'oneWeight.station': {
    formula: 'CB station − solid mass × (CG station − CB station) ÷ lift left',
    from: ['hull.cbStation', 'cg.station', 'mass.solid', 'lift.left'],
    source: 'Moments about the CB.',
  },
  'support.load': {
    formula: 'solid mass − gross lift',
    from: ['mass.solid', 'lift.gross'],
    source: 'Balance of forces.',
  },
  'support.pitch': {
    formula: 'W (G − S) − L (B − S) stands vertical, S the support point',
    from: ['mass.solid', 'lift.gross', 'cg.station', 'cg.height'],
    source: 'Moments about the support; least potential energy.',
  },
  'support.heel': {
    formula: 'W (G − S) − L (B − S) stands vertical, S the support point',
    from: ['mass.solid', 'lift.gross', 'cg.side', 'cg.height'],
    source: 'Moments about the support; least potential energy.',
  },
};

/** The working of the figure under that key, its inputs taken from the same report; null for a key that is none. */
export function workingOf(key: string, rows: Rows): Working | null {
  const recipe = Object.hasOwn(RECIPES, key) ? RECIPES[key]! : null;
  return (
    recipe && {
      formula: recipe.formula,
      inputs: recipe.from.flatMap((each) => rows[each] ?? []),
      source: recipe.source,
    }
  );
}
