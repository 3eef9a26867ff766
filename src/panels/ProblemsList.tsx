/** What the loading gate found wrong with a file. */
import { type Problem, problemText } from '../craft/problem.ts';

export interface ProblemsListProps {
  readonly title: string;
  readonly problems: readonly Problem[];
}

export function ProblemsList({ title, problems }: ProblemsListProps) {
  return (
    <section className="problems" aria-label={title} role="alert">
      <h3>{title}</h3>
      <ul>
        {problems.map((problem) => (
          <li key={problemText(problem)}>
            {problem.name && <strong>{problem.name} </strong>}
            <code>{problem.path || 'file'}</code>: found {problem.found}; allowed: {problem.allowed}.
          </li>
        ))}
      </ul>
    </section>
  );
}
