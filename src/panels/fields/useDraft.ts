/**
 * The text of a field while it is being typed. Enter and leaving the field commit, Escape restores. Text that cannot
 * be taken stays where it was typed, with a sentence that says why.
 */
import { type KeyboardEvent, useRef, useState } from 'react';
import type { Read } from './entry.ts';

/** How a field was left after its text was taken or dropped. */
export type Leave = 'enter' | 'escape' | 'blur';

export interface DraftRules<T> {
  readonly label: string;
  /** What the field shows of the value in the craft. */
  readonly shown: string;
  /** Text to begin with, as when typing opened the field. */
  readonly startWith?: string | undefined;
  read(text: string): Read<T>;
  /** Takes the value; a sentence when it cannot be taken. `stepped`: by an arrow key, of which many may follow. */
  commit(value: T, text: string, stepped?: boolean): string | null;
  onLeave?: ((how: Leave) => void) | undefined;
}

export interface Draft<T> {
  readonly text: string;
  readonly error: string | null;
  readonly set: (text: string) => void;
  /** Puts text and its value in place and commits at once, as an arrow key does. */
  readonly replace: (text: string, value: T) => void;
  /** Ref of the input: a form around it is not sent while the text is at fault. */
  readonly hold: (input: HTMLInputElement | null) => void;
  readonly onBlur: () => void;
  readonly onKeyDown: (event: KeyboardEvent) => void;
}

export function useDraft<T>(rules: DraftRules<T>): Draft<T> {
  const [draft, setDraft] = useState<string | null>(rules.startWith ?? null);
  const [error, setError] = useState<string | null>(null);
  /** Taken or dropped already. A field that closes then loses the focus, and that blur still sees the text of before. */
  const settled = useRef(false);
  const settle = (message: string | null): boolean => {
    setError(message);
    settled.current = message === null;
    if (message === null) setDraft(null);
    return message === null;
  };
  const submit = () => settle(draft === null || draft === rules.shown ? null : taken(rules, draft));
  const leave = (how: Leave) => {
    if (how === 'blur' && settled.current) return;
    if (how === 'escape' ? settle(null) : submit()) rules.onLeave?.(how);
  };
  return {
    text: draft ?? rules.shown,
    error,
    set: (text) => {
      settled.current = false;
      setDraft(text);
      // At once and not when the field is left: a sentence that goes while a button is pressed would move the button away.
      setError(null);
    },
    replace: (text, value) => {
      setDraft(text);
      settle(rules.commit(value, text, true));
      settled.current = false;
    },
    hold: (input) => input?.setCustomValidity(error ?? ''),
    onBlur: () => leave('blur'),
    onKeyDown: (event) => {
      if (event.key !== 'Enter' && event.key !== 'Escape') return;
      if (event.key === 'Escape' && draft === null && !rules.onLeave) return;
      // In a form Enter goes on to send it.
      if (event.key === 'Escape' || !(event.target as HTMLInputElement).form) event.preventDefault();
      event.stopPropagation();
      leave(event.key === 'Enter' ? 'enter' : 'escape');
    },
  };
}

/** Null when the text was taken, else the sentence that says why not. */
function taken<T>({ label, read, commit }: DraftRules<T>, text: string): string | null {
  const value = read(text);
  return value.ok ? commit(value.value, text) : `${label}: ${value.message}`;
}
