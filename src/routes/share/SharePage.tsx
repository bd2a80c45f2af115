import { useEffect, useRef, useState } from 'react';
import { FormProvider, useWatch } from 'react-hook-form';
import { useNavigate } from 'react-router-dom';
import { newIdempotencyKey } from '../../api/request.ts';
import { Button } from '../../components/Button.tsx';
import { ErrorSummary } from '../../components/ErrorSummary.tsx';
import { ProblemNote } from '../../components/ProblemNote.tsx';
import { UploadProgress } from '../../components/UploadProgress.tsx';
import { useMyMachine } from '../../machine/use-my-machine.ts';
import { goToField } from '../form/field-problems.ts';
import { CutStep } from './CutStep.tsx';
import { DrawingStep } from './DrawingStep.tsx';
import { draftName, forgetDraft, keepDraft, readDraft } from './draft.ts';
import { drawingProblem } from './drawing-problem.ts';
import { LicenceField } from './LicenceField.tsx';
import { Step } from './Step.tsx';
import type { ShareValues } from './share-values.ts';
import { useDrawing } from './use-drawing.ts';
import { usePublish } from './use-publish.ts';
import { useShareForm } from './use-share-form.ts';
import { WordsFields } from './WordsFields.tsx';

const goTo = (path: string): void => {
  if (path === 'drawing') document.getElementById('drawing')?.focus();
  else goToField(path);
};

/** One sheet in three steps; what is typed outlives a reload, until it is published. */
export function SharePage({ memberId }: { readonly memberId: string }) {
  const navigate = useNavigate();
  const { machine, machines } = useMyMachine();
  const [draft] = useState(() => readDraft(memberId));
  const [idempotencyKey, setIdempotencyKey] = useState(draft.idempotencyKey);
  const share = useShareForm(draft.values);
  const { form, errorAt } = share;
  const drawing = useDrawing(draftName(memberId), draft.values.scale.millimetresPerUnit);
  const values = useWatch({ control: form.control }) as ShareValues;
  const [wasTried, setWasTried] = useState(false);
  const missing = wasTried ? drawingProblem(drawing.state, values.scale.millimetresPerUnit) : null;
  const problems = [...(missing === null ? [] : [missing]), ...share.problems];

  const isPublished = useRef(false);
  useEffect(() => {
    if (!isPublished.current) keepDraft(memberId, { values, idempotencyKey });
  }, [memberId, values, idempotencyKey]);

  const publishing = usePublish({
    onPublished: (design) => {
      isPublished.current = true;
      void forgetDraft(memberId);
      void navigate(`/designs/${design.slug}`);
    },
    onFieldErrors: share.showErrors,
  });
  const submit = form.handleSubmit(async (details) => {
    if (
      drawing.state.phase !== 'read' ||
      drawingProblem(drawing.state, details.scale?.millimetresPerUnit) !== null
    )
      return;
    await publishing.publish(drawing.state.file, details, idempotencyKey);
  });
  const { title, kind, licence } = values;

  return (
    <FormProvider {...form}>
      <form
        noValidate
        className="max-w-5xl space-y-10"
        onSubmit={(event) => {
          setWasTried(true);
          void submit(event);
        }}
      >
        <ErrorSummary key={form.formState.submitCount} problems={problems} onGoTo={goTo} />
        <DrawingStep
          drawing={drawing}
          machine={machine}
          scaleError={missing?.path === 'scaleFrom' ? missing.message : errorAt('scale.millimetresPerUnit')}
        />
        <Step
          id="words"
          number={2}
          title="The words"
          hint="How members find it, and what they may do with it."
          isDone={title.trim() !== '' && kind !== '' && licence !== ''}
        >
          <div className="space-y-5">
            <WordsFields errorAt={errorAt} />
            <LicenceField error={errorAt('licence')} />
          </div>
        </Step>
        <CutStep share={share} machine={machine} machines={machines} />
        <div className="space-y-4 border-t-2 border-ink pt-5 md:pl-13">
          {publishing.refusal !== null && <ProblemNote problem={publishing.refusal} />}
          {publishing.refusal?.type === 'idempotency.reused' && (
            <Button onClick={() => setIdempotencyKey(newIdempotencyKey())}>
              It is another design: let me publish it too
            </Button>
          )}
          {publishing.share === null ? (
            <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
              <Button look="main" type="submit">
                Publish in the loft
              </Button>
              <p className="text-sm text-ink-soft">
                The drawing and its licence stay as published; words may change.
              </p>
            </div>
          ) : (
            <UploadProgress name={title} share={publishing.share} onCancel={publishing.cancel} />
          )}
        </div>
      </form>
    </FormProvider>
  );
}
