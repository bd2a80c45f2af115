import { useFormContext, useWatch } from 'react-hook-form';
import { ChangeNoteField } from './ChangeNoteField.tsx';
import { LicenceField } from './LicenceField.tsx';
import { Step } from './Step.tsx';
import type { ShareMode } from './share-mode.ts';
import type { ShareValues } from './share-values.ts';
import { WordsFields } from './WordsFields.tsx';

interface WordsStepProps {
  readonly mode: ShareMode;
  readonly errorAt: (path: string) => string | undefined;
}

const words = {
  new: { title: 'The words', hint: 'How members find it, and what they may do with it.' },
  revision: {
    title: 'What changed',
    hint: 'Title, kind and tags stay with the design. Earlier revisions stay as they were published.',
  },
  remix: {
    title: 'The words',
    hint: 'A remix is a design of its own, linked to the revision it was made from and credited to its maker.',
  },
} as const;

const noteHints = {
  new: '',
  revision: 'One line for the revision table: holes 0.1 wider after four records',
  remix: 'What you changed of the original: bays 20 mm longer, for a taller vice',
} as const;

/** What is said of the drawing: words of its own unless it is a revision, a note of what changed, the licence. */
export function WordsStep({ mode, errorAt }: WordsStepProps) {
  const { control } = useFormContext<ShareValues>();
  const [title, kind, licence, changeNote] = useWatch({
    control,
    name: ['title', 'kind', 'licence', 'changeNote'],
  });
  const hasWords = mode.kind === 'revision' || (title.trim() !== '' && kind !== '');
  const hasNote = mode.kind === 'new' || changeNote.trim() !== '';
  return (
    <Step
      id="words"
      number={2}
      title={words[mode.kind].title}
      hint={words[mode.kind].hint}
      isDone={hasWords && hasNote && licence !== ''}
    >
      <div className="space-y-5">
        {mode.kind !== 'revision' && <WordsFields errorAt={errorAt} />}
        {mode.kind !== 'new' && <ChangeNoteField hint={noteHints[mode.kind]} error={errorAt('changeNote')} />}
        <LicenceField choice={mode} error={errorAt('licence')} />
      </div>
    </Step>
  );
}
