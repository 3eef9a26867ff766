/** A ground for gestures without a page: a real session, a scene worked out anew at each look, and what was shown. */

import type { Ground, Habits, Hand, Scene } from '../../src/canvas/gestures/gesture.ts';
import { CLEAR, type Overlay } from '../../src/canvas/overlay.ts';
import type { Craft } from '../../src/craft/craft.ts';
import { idsOf } from '../../src/edit/selection.ts';
import { Session } from '../../src/edit/session.ts';
import { aboveFigure, frontFigure, sideFigure } from '../../src/scene/figure.ts';
import {
  type Flatten,
  fromAbove,
  fromAstern,
  fromSide,
  hardpointPoints,
  wireLines,
} from '../../src/scene/flatten.ts';
import { FigureCache, type FigureMaker } from '../../src/scene/keepSame.ts';
import { thrustMarks } from '../../src/scene/thrustArrows.ts';
import { type PlanePoint, toScreen, type View } from '../../src/scene/view.ts';
import { wireHandles } from '../../src/scene/wireHandle.ts';
import { craft as fixture, geometry, subject, VIEW } from '../scene/fixture.ts';

export interface TestGround extends Ground {
  overlay(): Overlay;
  view(): View;
  fits(): number;
  craft(): Craft;
  /** A hand at a point of the plane. */
  at(point: PlanePoint, keys?: Partial<Hand>): Hand;
}

function groundOf(
  start: Craft,
  flatten: Flatten,
  make: FigureMaker,
  first: View,
  habits: Partial<Habits>,
): TestGround {
  const session = new Session(start);
  let overlay = CLEAR;
  let view = first;
  let fits = 0;
  const scene = (): Scene => {
    const { craft, selection } = session.getState();
    const drawn = geometry(craft);
    const figures = new FigureCache(make).figures(craft, drawn, 1 / view.scale);
    const lines = wireLines(drawn.wires, flatten);
    const ends = flatten === fromSide ? idsOf(selection, 'wire') : [];
    return {
      ...subject(craft),
      view,
      geometry: drawn,
      figures,
      lines,
      wireHandles: wireHandles({ craft, lines, figures }, ends, view.scale),
      hardpoints: hardpointPoints(drawn, flatten),
      thrust: thrustMarks(drawn.thrust, {
        way: flatten === fromAbove ? 'yaw' : 'pitch',
        scale: view.scale,
        shows: () => true,
        hands: () => true,
      }),
      support: flatten === fromSide && drawn.support ? fromSide(drawn.support) : null,
    };
  };
  return {
    session,
    habits: { snap: true, several: false, ...habits },
    lastClick: { current: null },
    scene,
    show: (change) => {
      overlay = { ...overlay, ...change };
    },
    setView: (change) => {
      view = change(view);
    },
    fit: () => {
      fits++;
    },
    overlay: () => overlay,
    view: () => view,
    fits: () => fits,
    craft: () => session.getState().craft,
    at: (point, keys = {}) => ({ ...OPEN_HAND, ...toScreen(view, point), ...keys }),
  };
}

const OPEN_HAND: Hand = { x: 0, y: 0, shift: false, ctrl: false, alt: false, touch: false };

export const sideGround = (start: Craft = fixture(), habits: Partial<Habits> = {}): TestGround =>
  groundOf(start, fromSide, sideFigure, VIEW, habits);

export const frontGround = (start: Craft = fixture(), habits: Partial<Habits> = {}): TestGround =>
  groundOf(start, fromAstern, frontFigure, { ...VIEW, originX: 420, pivot: 0 }, habits);

/** Nose up. */
export const groundFromAbove = (start: Craft = fixture(), habits: Partial<Habits> = {}): TestGround =>
  groundOf(
    start,
    fromAbove,
    aboveFigure,
    { ...VIEW, originX: 420, originY: 60, scale: 120, pivot: 0 },
    habits,
  );

/** The middle of a part's first piece as drawn. */
export const middleOf = (ground: Ground, id: string): PlanePoint =>
  ground.scene().figures.find(({ part }) => part === id)!.middle;
