/** When the page itself fails: the work is still in the store, can be saved to a file, and the page tried again. */
import { Component, type ReactNode } from 'react';
import { serialize } from '../craft/serialize.ts';
import { fileName } from '../panels/ledger/download.ts';
import { download } from './files.ts';
import type { Store } from './store.ts';

interface Props {
  readonly store: Store;
  readonly children: ReactNode;
}

export class ErrorBoundary extends Component<Props, { readonly error: Error | null }> {
  override state = { error: null };

  static getDerivedStateFromError(error: unknown) {
    return { error: error instanceof Error ? error : new Error(String(error)) };
  }

  readonly #save = () => {
    this.props.store.session.cancelDrag();
    const { craft } = this.props.store.session.getState();
    download(serialize(craft), fileName(craft.name, 'json'));
  };

  readonly #stepBack = () => {
    this.props.store.session.undo();
    this.setState({ error: null });
  };

  override render() {
    const { error } = this.state as { error: Error | null };
    if (!error) return this.props.children;
    return (
      <main className="failed">
        <h1>The page failed</h1>
        <p>
          The craft is still here, and was kept with its last change. This is a fault in Steelyard, not in
          your craft: <code>{error.message}</code>
        </p>
        <p className="group">
          <button type="button" className="command" onClick={this.#save}>
            Save the craft to a file
          </button>
          <button type="button" className="command" onClick={this.#stepBack}>
            Undo the last change and go on
          </button>
          <button type="button" className="command" onClick={() => location.reload()}>
            Load the page again
          </button>
        </p>
      </main>
    );
  }
}
