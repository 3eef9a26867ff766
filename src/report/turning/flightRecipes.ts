/** How the figures of air carried along, speed, pitch, climb, hover and inflow come about. */
import { LAMB, type Recipes, STATICS } from './recipe.ts';
import type { TurnKey } from './turnFigure.ts';

const FLOW = 'Frictionless flow by sources on the skin; H. Lamb, Hydrodynamics (1932), §§ 118, 121.';
const MOMENTUM = 'Momentum theory after Rankine and Froude.';
const PITCH = 'Moments about the CB in steady level flight; Munk, NACA TR 184 (1924).';
const PATH =
  'Statics of a steady straight path in the vertical plane, by Newton’s method; couples as in cruise.';
const HOERNER =
  'Hull after Hoerner, Fluid-Dynamic Drag (1965); fins as plates; what hangs outside by its drag area.';

type Flight = Exclude<TurnKey, `turn.${string}` | `glide.${string}`>;

export const FLIGHT_RECIPES: Recipes<Flight> = {
  'added.k1': { formula: 'α₀ ÷ (2 − α₀)', from: [], source: LAMB },
  'added.k2': { formula: 'β₀ ÷ (2 − β₀)', from: [], source: LAMB },
  'added.kPrime': {
    formula: '(b² − a²)² (α₀ − β₀) ÷ {(b² + a²)[2(b² − a²) + (b² + a²)(β₀ − α₀)]}',
    from: [],
    source: LAMB,
  },
  'added.hullK1': { formula: '−∮ φ ∂φ/∂n dS ÷ V, moving ahead', from: ['added.k1'], source: FLOW },
  'added.hullK2': { formula: '−∮ φ ∂φ/∂n dS ÷ V, moving sideways', from: ['added.k2'], source: FLOW },
  'added.hullKPrime': {
    formula: '−∮ φ ∂φ/∂n dS ÷ inertia of the displaced air, yawing about the CB',
    from: ['added.kPrime'],
    source: FLOW,
  },
  'inertia.yaw': {
    formula: 'Σ (I_z + m d²) of every solid mass, and the gas turning with the hull',
    from: [],
    source: 'Parallel-axis theorem.',
  },
  'inertia.airYaw': { formula: 'k′ × inertia of the displaced air', from: ['added.kPrime'], source: LAMB },
  'thrust.static': {
    formula: 'Σ static thrust, measured or (P · FM · √(2ρA))^⅔',
    from: [],
    source: `The craft as entered. ${MOMENTUM}`,
  },
  'speed.top': {
    formula: 'where Σ thrust ahead = drag;  T = T₀ (1 − V ÷ pitch speed)',
    from: ['thrust.static', 'speed.pitchSpeed', 'drag.atTop'],
    source: `${HOERNER} Thrust in a straight line from rest to pitch speed: common practice, no source.`,
  },
  'speed.cruise': {
    formula: 'where Σ thrust ahead at that throttle = drag; or as asked',
    from: ['thrust.static', 'speed.pitchSpeed'],
    source: HOERNER,
  },
  'speed.pitchSpeed': {
    formula: 'as given, or motor speed ÷ (2π × gear ratio) × pitch',
    from: [],
    source: 'The craft as entered.',
  },
  'drag.atTop': {
    formula: '½ρ V^⅔ C_DV u² + fins + ½ρ u² Σ drag areas',
    from: ['speed.top'],
    source: HOERNER,
  },
  'drag.hullShare': {
    formula: '½ρ V^⅔ C_DV u² ÷ drag',
    from: ['drag.atTop', 'speed.top'],
    source: HOERNER,
  },
  'drag.finShare': { formula: 'drag of the fins ÷ drag', from: ['drag.atTop', 'speed.top'], source: HOERNER },
  'drag.podShare': {
    formula: '½ρ u² Σ drag areas ÷ drag',
    from: ['drag.atTop', 'speed.top'],
    source: HOERNER,
  },
  'power.atRest': { formula: 'Σ √(T³ ÷ (2ρA))', from: ['thrust.static'], source: MOMENTUM },
  'power.atTop': {
    formula: 'Σ T (V ÷ 2 + √(V² ÷ 4 + T ÷ (2ρA)))',
    from: ['speed.top', 'drag.atTop'],
    source: MOMENTUM,
  },
  'power.shaftAtRest': {
    formula: 'Σ ideal power ÷ figure of merit',
    from: ['power.atRest'],
    source: 'Figures of merit as entered.',
  },
  'cruise.pitch': {
    formula: 'θ at which the six couples listed with it add up to nil',
    from: ['speed.cruise'],
    source: PITCH,
  },
  'cruise.thrustCouple': {
    formula: 'Σ T (a sin ε − h cos ε)',
    from: ['thrust.static', 'speed.cruise'],
    source: STATICS,
  },
  'cruise.dragCouple': {
    formula: 'Σ drag × height, of fins and of what hangs outside',
    from: ['speed.cruise'],
    source: STATICS,
  },
  'cruise.munkCouple': {
    formula: '(k3 − k1) ρV ½U² sin 2α',
    from: ['cruise.pitch', 'speed.cruise', 'added.k1'],
    source: 'Munk, NACA TR 184 (1924).',
  },
  'cruise.finCouple': {
    formula: 'Σ force square to each fin × its distance from the CB',
    from: ['cruise.pitch', 'speed.cruise'],
    source: 'Slope after Helmbold (1942).',
  },
  'cruise.crossFlowCouple': {
    formula: '−½ρ · 1.2 η S w|w| × distance of the outline’s centroid from the CB',
    from: ['cruise.pitch', 'speed.cruise'],
    source: 'Strips of finite length, Aeronautical Engineer’s Data Book.',
  },
  'cruise.pendulumCouple': {
    formula: 'g W [(x_G − x_B) cos θ − (z_B − z_G) sin θ]',
    from: ['cruise.pitch'],
    source: STATICS,
  },
  'cruise.rising': {
    formula: 'thrust and air upward − g × static heaviness',
    from: ['cruise.pitch', 'speed.cruise'],
    source: 'Balance of forces.',
  },
  'cruise.criticalSpeed': {
    formula: '√(g W h ÷ [(k3 − k1) ρV − ½ρ Σ S a sin²φ (x_fin − x_B)])',
    from: ['added.k1'],
    source: PITCH,
  },
  'cruise.heldPitch': {
    formula: 'θ at which the couples of cruise add up to nil, at 80 % of that speed',
    from: ['cruise.criticalSpeed'],
    source: PITCH,
  },
  'climb.rate': {
    formula: 'u sin θ + w cos θ where forces along, forces across and couples are all nil',
    from: ['climb.path', 'climb.pitch', 'thrust.static'],
    source: PATH,
  },
  'climb.path': { formula: 'θ − α', from: ['climb.pitch'], source: PATH },
  'climb.pitch': { formula: 'θ of that steady path', from: ['thrust.static'], source: PATH },
  'climb.best': {
    formula: 'greatest of the climb rates over pitch vectoring',
    from: ['climb.bestVector'],
    source: PATH,
  },
  'climb.bestVector': { formula: 'the angle of the fastest climb', from: ['climb.best'], source: PATH },
  'climb.descent': {
    formula: 'least of the climb rates over pitch vectoring',
    from: ['climb.descentVector'],
    source: PATH,
  },
  'climb.descentVector': {
    formula: 'the angle of the fastest descent',
    from: ['climb.descent'],
    source: PATH,
  },
  'hover.force': { formula: 'g × static heaviness', from: [], source: 'Archimedes.' },
  'hover.share': {
    formula: 'that force ÷ thrust at rest of the thrusters that can be turned so far',
    from: ['hover.force', 'thrust.static'],
    source: STATICS,
  },
  'hover.vector': {
    formula: '±90° − pitch: the thrust stands upright',
    from: ['hover.pitch'],
    source: STATICS,
  },
  'hover.pitch': {
    formula: 'W (G − S) − L (B − S) stands vertical, S where the thrust acts',
    from: ['hover.force'],
    source: 'Moments about S.',
  },
  'inflow.ratio': {
    formula: 'mean axial speed over the open disc ÷ speed of the craft',
    from: ['speed.cruise'],
    source: 'Frictionless flow by sources on the skin, with the layer and wake of the hull in it.',
  },
  'inflow.perWatt': {
    formula: '(U ÷ 2 + √(U² ÷ 4 + T ÷ (2ρA))) ÷ the same with ratio × U',
    from: ['inflow.ratio', 'speed.cruise'],
    source: MOMENTUM,
  },
  'inflow.wakeShare': {
    formula: 'area of disc within the layer or wake ÷ area of disc',
    from: ['speed.cruise'],
    source: 'Growth of the layer by momentum.',
  },
  'inflow.insideShare': {
    formula: 'area of disc within the hull ÷ area of disc',
    from: [],
    source: 'Geometry.',
  },
};
