import { Button } from '../../components/Button.tsx';
import { type FieldLabels, labelOf } from './field-problems.ts';
import type { Current } from './use-saved-form.ts';

interface ConflictNoteProps {
  readonly what: string;
  readonly current: Current;
  /** What stands in the form. */
  readonly mine: object;
  readonly labels: FieldLabels;
  /** How a value of a field reads, with its unit. */
  readonly say: (path: string, value: unknown) => string;
  readonly onKeepMine: () => void;
  readonly onTakeCurrent: () => void;
}

const flat = (value: unknown, path = ''): [string, unknown][] => {
  if (typeof value !== 'object' || value === null) return [[path, value]];
  if (Array.isArray(value) && value.every((item) => typeof item !== 'object')) return [[path, value]];
  return Object.entries(value).flatMap(([key, inner]) => flat(inner, path === '' ? key : `${path}.${key}`));
};

const notFields = new Set(['id', 'version', 'createdAt']);

/** Somebody was faster: what it is now, beside what was typed, and the choice between the two. */
export function ConflictNote(props: ConflictNoteProps) {
  const { what, current, mine, labels, say, onKeepMine, onTakeCurrent } = props;
  const typed = new Map(flat(mine));
  const differing = flat(current).filter(
    ([path, value]) => !notFields.has(path) && JSON.stringify(typed.get(path)) !== JSON.stringify(value),
  );
  return (
    <div role="alert" className="space-y-3 border-2 border-ochre bg-paper p-4">
      <p className="font-bold text-ochre-ink">This {what} was changed in the meantime</p>
      {differing.length === 0 ? (
        <p>It is now just what you typed.</p>
      ) : (
        <ul className="space-y-1">
          {differing.map(([path, value]) => (
            <li key={path}>
              {labelOf(labels, path)}: now <strong>{say(path, value)}</strong>, here{' '}
              {say(path, typed.get(path))}
            </li>
          ))}
        </ul>
      )}
      <div className="flex flex-wrap gap-3">
        <Button onClick={onTakeCurrent}>Take it as it is now</Button>
        <Button onClick={onKeepMine}>Save what I typed</Button>
      </div>
    </div>
  );
}
