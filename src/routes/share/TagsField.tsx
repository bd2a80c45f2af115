import { X } from 'lucide-react';
import { type KeyboardEvent, type Ref, useId, useState } from 'react';
import { Button } from '../../components/Button.tsx';
import { FieldFrame, inputLook } from '../../components/FieldFrame.tsx';

interface TagsFieldProps {
  readonly name: string;
  readonly value: readonly string[];
  readonly onChange: (tags: string[]) => void;
  readonly onBlur?: () => void;
  readonly ref?: Ref<HTMLInputElement>;
  readonly error?: string | undefined;
}

const MOST_TAGS = 12;
const clean = (text: string): string => text.trim().toLowerCase().replace(/\s+/g, ' ');

/** Tags as chips: a comma or Enter ends one, Backspace in the empty field takes the last away. */
export function TagsField({ name, value, onChange, onBlur, ref, error }: TagsFieldProps) {
  const id = useId();
  const [text, setText] = useState('');
  const add = (given: string) => {
    const fresh = given
      .split(',')
      .map(clean)
      .filter((tag, index, all) => tag !== '' && !value.includes(tag) && all.indexOf(tag) === index);
    if (fresh.length > 0) onChange([...value, ...fresh]);
    setText('');
  };
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key === 'Enter' && text.trim() !== '') {
      event.preventDefault();
      add(text);
    }
    if (event.key === 'Backspace' && text === '' && value.length > 0) onChange(value.slice(0, -1));
  };
  return (
    <div>
      <FieldFrame
        id={id}
        label="Tags"
        isOptional
        hint={`Up to ${MOST_TAGS}; a comma or Enter ends one.`}
        error={error}
      >
        <div className="flex gap-2">
          <input
            id={id}
            ref={ref}
            name={name}
            value={text}
            onChange={(event) =>
              event.target.value.includes(',') ? add(event.target.value) : setText(event.target.value)
            }
            onKeyDown={onKeyDown}
            onBlur={() => {
              add(text);
              onBlur?.();
            }}
            autoComplete="off"
            enterKeyHint="done"
            aria-invalid={error !== undefined}
            aria-describedby={`${id}-hint${error === undefined ? '' : ` ${id}-error`}`}
            className={inputLook}
          />
          <Button disabled={text.trim() === ''} onClick={() => add(text)}>
            Add
          </Button>
        </div>
      </FieldFrame>
      {value.length > 0 && (
        <ul aria-label="Tags so far" className="mt-2 flex flex-wrap gap-2">
          {value.map((tag) => (
            <li key={tag}>
              <button
                type="button"
                aria-label={`Take away the tag ${tag}`}
                onClick={() => onChange(value.filter((other) => other !== tag))}
                className="flex min-h-8 items-center gap-1.5 border border-ink bg-paper px-2 text-sm hover:border-layout hover:text-layout"
              >
                {tag}
                <X size={14} strokeWidth={1.75} aria-hidden="true" />
              </button>
            </li>
          ))}
        </ul>
      )}
    </div>
  );
}
