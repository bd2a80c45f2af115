/** What the server says when it refuses (RFC 9457). */
interface Problem {
  readonly title: string;
  readonly status?: number | undefined;
  readonly detail?: string | undefined;
  readonly errors?: readonly { readonly path: string; readonly message: string }[] | undefined;
  readonly requestId?: string | undefined;
}

interface ProblemNoteProps {
  readonly problem: Problem;
  /** A word for a path that the reader knows, such as the label of its field. */
  readonly nameOf?: (path: string) => string;
}

export function ProblemNote({ problem, nameOf = (path) => path }: ProblemNoteProps) {
  const ours = problem.status !== undefined && problem.status >= 500 && problem.requestId !== undefined;
  return (
    <div role="alert" className="border-2 border-brick bg-paper p-4">
      <p className="font-bold text-brick">
        <span aria-hidden="true">✕ </span>
        {problem.title}
      </p>
      {problem.detail !== undefined && <p className="mt-1">{problem.detail}</p>}
      {problem.errors !== undefined && problem.errors.length > 0 && (
        <ul className="mt-2 space-y-1 border-t border-rule pt-2">
          {problem.errors.map(({ path, message }) => (
            <li key={`${path} ${message}`} className="grid gap-x-4 sm:grid-cols-[12rem_1fr]">
              <span className="figures text-sm leading-6 break-words text-ink-soft">{nameOf(path)}</span>
              <span>{message}</span>
            </li>
          ))}
        </ul>
      )}
      {ours && <p className="figures mt-2 text-xs text-ink-soft">Request {problem.requestId}</p>}
    </div>
  );
}
