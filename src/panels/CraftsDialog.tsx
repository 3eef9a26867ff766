/** The crafts kept in this browser, and the samples to start from. What they do is the page's business. */
import { useState } from 'react';
import { DialogFrame } from './DialogFrame.tsx';
import { TextField } from './fields/TextField.tsx';

/** An earlier text of a craft. */
export interface CraftVersion {
  /** Milliseconds since 1970. */
  readonly changedAt: number;
  readonly name: string;
}

export interface CraftEntry {
  readonly id: string;
  readonly name: string;
  /** Milliseconds since 1970. */
  readonly changedAt: number;
  /** Whether it is the one on the page. */
  readonly current: boolean;
  /** Earlier versions, newest first. */
  readonly versions: readonly CraftVersion[];
}

export interface SampleEntry {
  readonly id: string;
  readonly name: string;
  /** One sentence on what it shows. */
  readonly note: string;
}

export interface CraftsDialogProps {
  /** Newest first. */
  readonly crafts: readonly CraftEntry[];
  readonly samples: readonly SampleEntry[];
  onOpen(id: string): void;
  /** Opens an earlier version as a craft of its own; `index` counts in `versions`. */
  onOpenVersion(id: string, index: number): void;
  onRename(id: string, name: string): void;
  onDuplicate(id: string): void;
  onDelete(id: string): void;
  onSample(id: string): void;
  onNew(): void;
  onClose(): void;
}

export function CraftsDialog(props: CraftsDialogProps) {
  const { crafts, samples, onSample, onNew, onClose } = props;
  return (
    <DialogFrame title="Crafts" onClose={onClose}>
      <div className="toolbar">
        <button type="button" className="primary" onClick={onNew}>
          New craft…
        </button>
      </div>
      <h3>Kept in this browser</h3>
      {crafts.length === 0 && <p className="aside">None yet.</p>}
      <ul className="catalogue">
        {crafts.map((craft) => (
          <CraftItem key={craft.id} craft={craft} actions={props} />
        ))}
      </ul>
      <h3>Samples to start from</h3>
      <ul className="catalogue">
        {samples.map(({ id, name, note }) => (
          <li key={id}>
            <div>
              <strong>{name}</strong>
              <p className="aside">{note}</p>
            </div>
            <button type="button" aria-label={`Start from ${name}`} onClick={() => onSample(id)}>
              Start
            </button>
          </li>
        ))}
      </ul>
    </DialogFrame>
  );
}

const dateText = (milliseconds: number): string =>
  new Date(milliseconds).toLocaleString(undefined, { dateStyle: 'medium', timeStyle: 'short' });

type Actions = Pick<CraftsDialogProps, 'onOpen' | 'onOpenVersion' | 'onRename' | 'onDuplicate' | 'onDelete'>;

function CraftItem({ craft, actions }: { craft: CraftEntry; actions: Actions }) {
  const { id, changedAt, current } = craft;
  const name = craft.name || 'Craft without a name';
  const rename = (next: string) => {
    actions.onRename(id, next);
    return null;
  };
  return (
    <li>
      <div>
        <TextField bare label={`Name of ${name}`} value={craft.name} onCommit={rename} />
        <p className="aside">
          {current ? 'On the page now. ' : ''}Changed {dateText(changedAt)}
        </p>
        <Versions craft={craft} onOpenVersion={actions.onOpenVersion} />
      </div>
      <button type="button" aria-label={`Open ${name}`} disabled={current} onClick={() => actions.onOpen(id)}>
        Open
      </button>
      <button type="button" aria-label={`Duplicate ${name}`} onClick={() => actions.onDuplicate(id)}>
        Duplicate
      </button>
      <DeleteButton name={name} disabled={current} onDelete={() => actions.onDelete(id)} />
    </li>
  );
}

function Versions({
  craft: { id, versions },
  onOpenVersion,
}: { craft: CraftEntry } & Pick<Actions, 'onOpenVersion'>) {
  if (versions.length === 0) return null;
  return (
    <details>
      <summary>Earlier versions ({versions.length})</summary>
      <ul>
        {versions.map(({ changedAt, name }, index) => (
          <li key={changedAt}>
            {name}, {dateText(changedAt)}{' '}
            <button
              type="button"
              aria-label={`Open ${name} as it was on ${dateText(changedAt)}`}
              onClick={() => onOpenVersion(id, index)}
            >
              Open
            </button>
          </li>
        ))}
      </ul>
    </details>
  );
}

interface DeleteButtonProps {
  readonly name: string;
  readonly disabled: boolean;
  onDelete(): void;
}

/** Asks once more before a craft is gone. */
function DeleteButton({ name, disabled, onDelete }: DeleteButtonProps) {
  const [asked, setAsked] = useState(false);
  if (!asked) {
    return (
      <button type="button" aria-label={`Delete ${name}`} disabled={disabled} onClick={() => setAsked(true)}>
        Delete…
      </button>
    );
  }
  return (
    <fieldset className="confirm" aria-label={`Delete ${name}?`}>
      <button type="button" className="danger" onClick={onDelete}>
        Delete for good
      </button>
      <button type="button" onClick={() => setAsked(false)}>
        Keep it
      </button>
    </fieldset>
  );
}
