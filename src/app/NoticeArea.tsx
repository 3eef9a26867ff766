/** Where short messages stand. Politely announced; a bad one says so in words too. */
import { useCell } from './cell.ts';
import { Icon } from './Icon.tsx';
import type { Notice, Notices } from './notices.ts';

export function NoticeArea({ notices }: { notices: Notices }) {
  const shown = useCell(notices);
  return (
    <section className="notices" aria-label="Notices" aria-live="polite">
      {shown.map((notice) => (
        <NoticeLine key={notice.id} notice={notice} dismiss={() => notices.dismiss(notice.id)} />
      ))}
    </section>
  );
}

function NoticeLine({ notice: { tone, message, action }, dismiss }: { notice: Notice; dismiss: () => void }) {
  const act = () => {
    dismiss();
    action?.run();
  };
  return (
    <div className={`notice ${tone}`}>
      <p>{message}</p>
      {action && (
        <button type="button" className="command" onClick={act}>
          {action.label}
        </button>
      )}
      <button type="button" className="command" aria-label="Dismiss" onClick={dismiss}>
        <Icon name="close" />
      </button>
    </div>
  );
}
