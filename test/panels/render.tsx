/** Renders a panel to markup on a craft, as the page would around it. */
import { createElement, type FunctionComponent } from 'react';
import { renderToStaticMarkup } from 'react-dom/server';
import type { Craft } from '../../src/craft/craft.ts';
import type { Selection } from '../../src/edit/selection.ts';
import { Session } from '../../src/edit/session.ts';
import { type Editor, EditorContext } from '../../src/panels/editor.ts';
import { assess } from '../../src/report/assess.ts';
import type { UnitSystem } from '../../src/units/units.ts';

export interface Setting {
  readonly selection?: Selection;
  readonly units?: UnitSystem;
}

export function editorOn(craft: Craft, { selection = [], units = 'metric' }: Setting = {}): Editor {
  const session = new Session(craft);
  session.select(selection);
  return {
    session,
    craft,
    selection,
    dragging: false,
    undoLabel: null,
    redoLabel: null,
    assessment: assess(craft, units),
    units,
    several: false,
    apply: (edit) => session.apply(edit).length === 0,
    select: (next) => session.select(next),
    notify: () => {},
  };
}

export function render<P extends object>(
  component: FunctionComponent<P>,
  props: P,
  craft: Craft,
  setting?: Setting,
): string {
  const panel = createElement(component, props);
  return renderToStaticMarkup(createElement(EditorContext, { value: editorOn(craft, setting) }, panel));
}

/** The text a reader sees, tags taken out. */
export const seen = (markup: string): string =>
  markup
    .replace(/<[^>]+>/g, ' ')
    .replaceAll('&#x27;', "'")
    .replaceAll('&quot;', '"')
    .replaceAll('&amp;', '&')
    .replace(/\s+/g, ' ');

/** Inputs, selects and text areas that no label names. */
export function unnamed(markup: string): string[] {
  const labelled = new Set([...markup.matchAll(/<label[^>]* for="([^"]+)"/g)].map(([, id]) => id));
  const fields = [...markup.matchAll(/<(?:input|select|textarea)\b[^>]*>/g)].map(([tag]) => tag);
  return fields.filter((tag) => {
    const id = /\bid="([^"]+)"/.exec(tag)?.[1];
    return !/aria-label="[^"]+"/.test(tag) && !(id && labelled.has(id));
  });
}

/** Ids that aria-describedby, aria-controls or aria-labelledby name and that nothing has. */
export function danglingIds(markup: string): string[] {
  const ids = new Set([...markup.matchAll(/\bid="([^"]+)"/g)].map(([, id]) => id));
  const named = [...markup.matchAll(/aria-(?:describedby|controls|labelledby)="([^"]+)"/g)];
  return named.flatMap(([, list]) => list!.split(' ')).filter((id) => !ids.has(id));
}
