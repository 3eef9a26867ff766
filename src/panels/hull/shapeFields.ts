/** The plain fields of each hull form; those given by rows have a table besides. */
import type { HullShape, ShapeKind } from '../../craft/hullSchema.ts';
import type { Quantity } from '../../units/units.ts';
import type { Choice } from '../words.ts';

/** One field of a form: a quantity, a whole number, or one of a few. */
export interface ShapeField {
  readonly key: string;
  readonly label: string;
  readonly input: Quantity | 'whole' | readonly Choice<string>[];
  readonly hint?: string;
}

const LENGTH: ShapeField = { key: 'length', label: 'Length', input: 'length', hint: 'Nose tip to tail tip' };
const DIAMETER: ShapeField = { key: 'diameter', label: 'Greatest diameter', input: 'length' };

const END_CHOICES: readonly Choice<string>[] = [
  { value: 'ellipsoid', label: 'Half-ellipsoid' },
  { value: 'ogive', label: 'Ogive' },
  { value: 'cone', label: 'Cone' },
  { value: 'flat', label: 'Flat' },
];

const FIELDS: Readonly<Record<ShapeKind, readonly ShapeField[]>> = {
  spheroid: [LENGTH, DIAMETER],
  twoSpheroid: [
    { key: 'foreLength', label: 'Fore length', input: 'length', hint: 'Nose tip to the widest station' },
    { key: 'aftLength', label: 'Aft length', input: 'length', hint: 'Widest station to the tail tip' },
    DIAMETER,
  ],
  naca4: [
    LENGTH,
    DIAMETER,
    {
      key: 'tail',
      label: 'Tail tip',
      input: [
        { value: 'closed', label: 'Closed to a point' },
        { value: 'open', label: 'Small blunt tail' },
      ],
    },
  ],
  series58: [
    LENGTH,
    DIAMETER,
    { key: 'widest', label: 'Widest at', input: 'fraction', hint: 'Share of the length' },
    { key: 'noseRadius', label: 'Nose radius', input: 'ratio', hint: 'r0 L/D²' },
    { key: 'tailRadius', label: 'Tail radius', input: 'ratio', hint: 'r1 L/D²' },
    {
      key: 'prismatic',
      label: 'Prismatic coefficient',
      input: 'ratio',
      hint: 'Volume over that of the cylinder around it',
    },
  ],
  myring: [
    { key: 'noseLength', label: 'Nose length a', input: 'length' },
    { key: 'middleLength', label: 'Middle length b', input: 'length' },
    { key: 'tailLength', label: 'Tail length c', input: 'length' },
    DIAMETER,
    { key: 'nosePower', label: 'Nose exponent n', input: 'ratio' },
    { key: 'tailAngle', label: 'Tail angle θ', input: 'angle', hint: 'Half the angle at the tip' },
    { key: 'noseOffset', label: 'Nose cut', input: 'length', hint: 'Length cut from the nose section' },
    { key: 'tailOffset', label: 'Tail cut', input: 'length', hint: 'Length cut from the tail section' },
  ],
  cylinder: [
    DIAMETER,
    { key: 'noseEnd', label: 'Nose end', input: END_CHOICES },
    { key: 'noseLength', label: 'Nose length', input: 'length' },
    { key: 'middleLength', label: 'Middle length', input: 'length' },
    { key: 'tailEnd', label: 'Tail end', input: END_CHOICES },
    { key: 'tailLength', label: 'Tail length', input: 'length' },
  ],
  offsets: [
    {
      key: 'along',
      label: 'Measured along',
      input: [
        { value: 'station', label: 'The axis: station' },
        { value: 'tape', label: 'The skin: tape distance' },
      ],
    },
    {
      key: 'across',
      label: 'Measured across',
      input: [
        { value: 'diameter', label: 'Diameter' },
        { value: 'girth', label: 'Girth' },
      ],
    },
  ],
  gores: [{ key: 'count', label: 'Gores', input: 'whole' }],
  twoSheet: [],
  roundTwoSheet: [
    { key: 'flatDiameter', label: 'Flat diameter', input: 'length', hint: 'Seam to seam, before filling' },
    {
      key: 'stance',
      label: 'Stance',
      input: [
        { value: 'lying', label: 'Lying: seam level' },
        { value: 'standing', label: 'Standing on edge' },
      ],
    },
  ],
};

export const fieldsOf = (kind: ShapeKind): readonly ShapeField[] => FIELDS[kind];

/** The value a field shows. */
export const fieldValue = (shape: HullShape, { key }: ShapeField): number | string =>
  (shape as Readonly<Record<string, unknown>>)[key] as number | string;

export interface RowColumn {
  readonly key: string;
  readonly label: string;
}

export type RowShape = Extract<HullShape, { readonly rows: unknown }>;
/** One measured or cut row, SI. */
export type HullRow = Readonly<Record<string, number>>;

/** The two columns of a form's table. */
export function columnsOf(shape: RowShape): readonly [RowColumn, RowColumn] {
  if (shape.kind === 'offsets') {
    return [
      { key: 'at', label: shape.along === 'station' ? 'Station' : 'Tape distance' },
      { key: 'size', label: shape.across === 'diameter' ? 'Diameter' : 'Girth' },
    ];
  }
  return [
    { key: 'tape', label: 'Along the centre line' },
    { key: 'width', label: shape.kind === 'gores' ? 'Width of a gore' : 'Width of a sheet' },
  ];
}

export const hasRows = (shape: HullShape): shape is RowShape => 'rows' in shape;
