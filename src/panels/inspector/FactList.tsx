/** What follows from the fields, as name and text. */
export interface Fact {
  readonly label: string;
  readonly text: string;
}

export function FactList({ facts }: { facts: readonly Fact[] }) {
  return (
    <dl className="rows">
      {facts.map(({ label, text }) => (
        <div className="row" key={label}>
          <dt>{label}</dt>
          <dd className="number">{text}</dd>
        </div>
      ))}
    </dl>
  );
}
