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
import { SettingsFindings } from './SettingsFindings.tsx';
import { type ShareMode, sharePath } from './share-mode.ts';
import { type ShareValues, startOf } from './share-values.ts';
import { useDrawing } from './use-drawing.ts';
import { usePublish } from './use-publish.ts';
import { useSettingsFindings } from './use-settings-findings.ts';
import { useShareForm } from './use-share-form.ts';
import { WordsStep } from './WordsStep.tsx';

const goTo = (path: string): void => {
  if (path === 'drawing') document.getElementById('drawing')?.focus();
  else goToField(path);
};

const does = (mode: ShareMode): string => {
  if (mode.kind === 'new') return 'Publish in the loft';
  return mode.kind === 'revision' ? `Issue revision ${mode.number}` : 'Publish the remix';
};

interface SharePageProps {
  readonly memberId: string;
  /** It stays the same while the page is open. */
  readonly mode: ShareMode;
}

/** One sheet in three steps; what is typed outlives a reload, until it is published. */
export function SharePage({ memberId, mode }: SharePageProps) {
  const navigate = useNavigate();
  const name = draftName(memberId, mode);
  const { machine, machines } = useMyMachine();
  const [draft] = useState(() => readDraft(name, startOf(mode)));
  const [idempotencyKey, setIdempotencyKey] = useState(draft.idempotencyKey);
  const share = useShareForm(draft.values, mode);
  const { form, errorAt } = share;
  const drawing = useDrawing(name, draft.values.scale.millimetresPerUnit);
  const values = useWatch({ control: form.control }) as ShareValues;
  const [wasTried, setWasTried] = useState(false);
  const missing = wasTried ? drawingProblem(drawing.state, values.scale.millimetresPerUnit) : null;
  const problems = [...(missing === null ? [] : [missing]), ...share.problems];

  const isPublished = useRef(false);
  useEffect(() => {
    if (!isPublished.current) keepDraft(name, { values, idempotencyKey });
  }, [name, values, idempotencyKey]);

  const findings = useSettingsFindings(values, machines);
  const isStopped = findings.some(({ level }) => level === 'do-not-cut');
  const publishing = usePublish({
    path: sharePath(mode),
    onPublished: (design) => {
      isPublished.current = true;
      void forgetDraft(name);
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
  const publishWithoutSettings = () => {
    form.setValue('isCut', 'no');
    setWasTried(true);
    void submit();
  };

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
        <WordsStep mode={mode} errorAt={errorAt} />
        <CutStep share={share} machine={machine} machines={machines} />
        {findings.length > 0 && (
          <div className="md:pl-13">
            <SettingsFindings findings={findings} />
          </div>
        )}
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
                {isStopped ? `${does(mode)}, settings to wait` : does(mode)}
              </Button>
              {isStopped && <Button onClick={publishWithoutSettings}>Publish without the settings</Button>}
              <p className="text-sm text-ink-soft">
                The drawing and its licence stay as published; words may change.
              </p>
            </div>
          ) : (
            <UploadProgress
              name={mode.kind === 'revision' ? mode.title : values.title}
              share={publishing.share}
              onCancel={publishing.cancel}
            />
          )}
        </div>
      </form>
    </FormProvider>
  );
}
