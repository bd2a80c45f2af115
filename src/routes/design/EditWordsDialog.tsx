import { zodResolver } from '@hookform/resolvers/zod';
import { FormProvider } from 'react-hook-form';
import { type Design, type DesignDetails, designDetails } from '#shared/api/designs.ts';
import { useChangeDesign } from '../../api/designs.ts';
import { Dialog } from '../../components/Dialog.tsx';
import { kindLabels } from '../../words/labels.ts';
import { ConflictNote } from '../form/ConflictNote.tsx';
import { FormFrame } from '../form/FormFrame.tsx';
import { useSavedForm } from '../form/use-saved-form.ts';
import { shareLabels } from '../share/share-labels.ts';
import { WordsFields } from '../share/WordsFields.tsx';

type Words = Pick<DesignDetails, 'title' | 'kind' | 'summary' | 'tags'>;
const words = designDetails.pick({ title: true, kind: true, summary: true, tags: true });
const wordsOf = ({ title, kind, summary, tags }: Words): Words => ({ title, kind, summary, tags });

const say = (path: string, value: unknown): string => {
  if (path === 'kind' && typeof value === 'string' && value in kindLabels)
    return kindLabels[value as Words['kind']];
  if (Array.isArray(value)) return value.length === 0 ? 'none' : value.join(', ');
  return value === '' ? 'nothing' : `“${String(value)}”`;
};

interface EditWordsDialogProps {
  readonly design: Design;
  readonly onClose: () => void;
}

/** Title, kind, summary and tags may change; drawing, revision and licence stay as they were published. */
export default function EditWordsDialog({ design, onClose }: EditWordsDialogProps) {
  const change = useChangeDesign(design.slug);
  const saved = useSavedForm<Words>({
    resolver: zodResolver(words),
    values: wordsOf(design),
    labels: shareLabels,
    version: design.version,
    save: (given, version) => change.mutateAsync({ ...given, version: version ?? design.version }),
    onSaved: onClose,
  });
  const { current } = saved;
  const now = current as unknown as Design | null;
  return (
    <Dialog title="Edit the words" isOpen onClose={onClose}>
      <FormProvider {...saved.form}>
        <FormFrame
          saved={saved}
          does="Save the words"
          onCancel={onClose}
          conflict={
            now !== null && (
              <ConflictNote
                what="design"
                current={{ version: now.version, ...wordsOf(now) }}
                mine={saved.form.getValues()}
                labels={shareLabels}
                say={say}
                onKeepMine={saved.keepMine}
                onTakeCurrent={() => saved.takeCurrent(wordsOf(now))}
              />
            )
          }
        >
          <WordsFields errorAt={saved.errorAt} />
        </FormFrame>
      </FormProvider>
    </Dialog>
  );
}
