/** The stations that nothing beats. One that is picked can be moved to; one that is pointed at is marked in the drawing. */
import { useState } from 'react';
import { moveAndHang, moveThruster } from '../../edit/edits/moveThruster.ts';
import { placed } from '../../edit/place.ts';
import type { PlacedPoint } from '../../report/turning/studies.ts';
import { formatNumber } from '../../units/format.ts';
import { inUnits } from '../../units/sentence.ts';
import { type Quantity, type UnitSystem, unitOf } from '../../units/units.ts';
import { useEditor } from '../editor.ts';
import { useStudying } from './studying.ts';
import { useTurning } from './turning.ts';

interface Column {
  readonly head: string;
  readonly quantity: Quantity;
  value(point: PlacedPoint): number | null;
}

const COLUMNS: readonly Column[] = [
  {
    head: 'Lead, wire',
    quantity: 'mass',
    value: ({ ballast, wire }) => (ballast === null ? null : ballast + wire),
  },
  { head: '90° in', quantity: 'time', value: ({ timeTo90 }) => timeTo90 },
  { head: 'Radius', quantity: 'pathLength', value: ({ radius }) => radius },
  { head: 'Gust', quantity: 'speed', value: ({ gustHeld }) => gustHeld },
  { head: 'Per watt', quantity: 'ratio', value: ({ perWatt }) => perWatt },
  { head: 'Pitch', quantity: 'angle', value: ({ cruisePitch }) => cruisePitch },
];

interface StudyTableProps {
  readonly fresh: boolean;
  /** The station that the sentence above tells of, open until another is picked. */
  readonly told: number | null;
}

export function StudyTable({ fresh, told }: StudyTableProps) {
  const { units } = useEditor();
  const { points, today, busy } = useStudying();
  const [chosen, setPicked] = useState<number | null | undefined>(undefined);
  const picked = chosen === undefined ? told : chosen;
  const best = points.filter((point) => point.best);
  if (best.length === 0) {
    return (
      <p>
        {busy
          ? 'None so far that can be flown.'
          : 'No station has both a ballast plan and room for the propeller.'}
      </p>
    );
  }
  return (
    <div className="plan-scroll">
      <table className="study-table">
        <caption>Nothing beats these{busy && ' so far'}</caption>
        <thead>
          <tr>
            <th scope="col">
              Station <small>{unitOf('length', units).symbol}</small>
            </th>
            {COLUMNS.map(({ head, quantity }) => (
              <th scope="col" key={head}>
                {head} <small>{unitOf(quantity, units).symbol}</small>
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {today && (
            <tr>
              <th scope="row">today</th>
              <Figures point={today} />
            </tr>
          )}
          {best.map((point) => (
            <StudyRow
              key={point.station}
              point={point}
              open={point.station === picked}
              fresh={fresh}
              onPick={() => setPicked(point.station === picked ? null : point.station)}
            />
          ))}
        </tbody>
      </table>
    </div>
  );
}

interface StudyRowProps {
  readonly point: PlacedPoint;
  readonly open: boolean;
  readonly fresh: boolean;
  onPick(): void;
}

function StudyRow({ point, open, fresh, onPick }: StudyRowProps) {
  const { units } = useEditor();
  const { set } = useTurning();
  const mark = () => set({ marked: point.station });
  const unmark = () => set({ marked: null });
  const at = bare(point.station, 'length', units);
  return (
    <>
      <tr data-station={point.station} onPointerEnter={mark} onPointerLeave={unmark}>
        <th scope="row">
          <button
            type="button"
            className="small"
            aria-expanded={open}
            onClick={onPick}
            onFocus={mark}
            onBlur={unmark}
          >
            {at}
          </button>
        </th>
        <Figures point={point} />
      </tr>
      {open && (
        <tr className="kept-actions" onPointerEnter={mark} onPointerLeave={unmark}>
          <td colSpan={COLUMNS.length + 1}>
            <Actions point={point} at={at} fresh={fresh} />
          </td>
        </tr>
      )}
    </>
  );
}

function Figures({ point }: { point: PlacedPoint }) {
  const { units } = useEditor();
  return COLUMNS.map(({ head, quantity, value }) => {
    const figure = value(point);
    return (
      <td className="number" key={head}>
        {figure === null ? '–' : bare(figure, quantity, units)}
      </td>
    );
  });
}

/** Without its unit, which stands in the head. */
const bare = (si: number, quantity: Quantity, units: UnitSystem): string => {
  const unit = unitOf(quantity, units);
  return formatNumber(unit.toDisplay(si), unit.digits);
};

function Actions({ point, at, fresh }: { point: PlacedPoint; at: string; fresh: boolean }) {
  const { craft, units, apply, dragging } = useEditor();
  const { part } = useStudying();
  const thruster = craft.parts.byId[part ?? ''];
  if (!thruster) return null;
  if (thruster.locked)
    return <p className="aside">{thruster.name || 'It'} is locked. Unlock it to move it.</p>;
  const { stowage } = point;
  const ready = fresh && !dragging;
  const here = placed(thruster.place, point.place) === thruster.place;
  return (
    <>
      {point.cautions.map((caution) => (
        <p className="row-why" key={caution}>
          {inUnits(caution, units)}
        </p>
      ))}
      <span className="plan-actions">
        {here ? (
          <span className="aside">It is there now.</span>
        ) : (
          <button
            type="button"
            aria-disabled={!ready}
            onClick={() => ready && apply(moveThruster(thruster, point.place))}
          >
            Move it there<span className="spoken">, to {at}</span>
          </button>
        )}
        {stowage && (
          <button
            type="button"
            aria-disabled={!ready}
            onClick={() => ready && apply(moveAndHang(thruster, point.place, stowage))}
          >
            {here ? 'Hang the ballast' : 'Move it, hang the ballast'}
            <span className="spoken">, at {at}</span>
          </button>
        )}
      </span>
    </>
  );
}
