import { useFormContext, useWatch } from 'react-hook-form';
import type { Machine } from '#shared/api/bench.ts';
import { Button } from '../../components/Button.tsx';
import { DropZone } from '../../components/DropZone.tsx';
import { ProblemNote } from '../../components/ProblemNote.tsx';
import { DrawingRead } from './DrawingRead.tsx';
import { drawingProblem } from './drawing-problem.ts';
import { type ScaleChoice, ScaleQuestion } from './ScaleQuestion.tsx';
import { Step } from './Step.tsx';
import type { ShareValues } from './share-values.ts';
import type { useDrawing } from './use-drawing.ts';

interface DrawingStepProps {
  readonly drawing: ReturnType<typeof useDrawing>;
  readonly machine: Machine | null;
  readonly scaleError: string | undefined;
}

/** The file, how large it is, and what was read of it. */
export function DrawingStep({ drawing, machine, scaleError }: DrawingStepProps) {
  const { setValue, control, clearErrors } = useFormContext<ShareValues>();
  const [scaleFrom, measuredMm, scale] = useWatch({
    control,
    name: ['scaleFrom', 'measuredMm', 'scale'],
  });
  const { state, read, cancel, rescale } = drawing;

  const forgetScale = () => {
    setValue('scaleFrom', '');
    setValue('measuredMm', undefined);
    setValue('scale', {});
    clearErrors('scale');
  };
  const choose = ({ from, measuredMm: measured, millimetresPerUnit }: ScaleChoice) => {
    setValue('scaleFrom', from);
    setValue('measuredMm', measured);
    setValue('scale', { millimetresPerUnit });
    clearErrors('scale');
    if (millimetresPerUnit !== undefined) void rescale(millimetresPerUnit);
  };
  const isDone = drawingProblem(state, scale.millimetresPerUnit) === null;
  const isUnread =
    state.phase === 'read' &&
    !state.isRescaling &&
    scale.millimetresPerUnit !== undefined &&
    state.shownScale !== scale.millimetresPerUnit;
  return (
    <Step
      id="drawing"
      number={1}
      title="The drawing"
      hint="It is read into millimetres and shown as it will be cut. Nothing is published yet."
      isDone={isDone}
    >
      <div className="space-y-6">
        {state.phase === 'refused' && <ProblemNote problem={state.problem} />}
        {state.phase !== 'read' && (
          <DropZone
            label="Drop an SVG here, or paste one"
            hint="At most 10 MB. Text must be converted to outlines before it can be cut."
            sending={state.phase === 'sending' ? { name: state.name, share: state.share } : null}
            onCancel={cancel}
            onFile={(file) => {
              forgetScale();
              read(file);
            }}
          />
        )}
        {state.phase === 'read' && (
          <>
            {!state.asFiled.units.confirmed && (
              <ScaleQuestion
                asFiled={state.asFiled}
                choice={{ from: scaleFrom, measuredMm }}
                onChoose={choose}
                error={scaleError}
              />
            )}
            {isUnread && (
              <div className="flex flex-wrap items-center gap-x-4 gap-y-2 border-2 border-brick bg-paper p-4">
                <p role="alert">It could not be read at this scale: the club’s server does not answer.</p>
                <Button onClick={() => void rescale(scale.millimetresPerUnit ?? 1)}>Try again</Button>
              </div>
            )}
            <DrawingRead
              inspection={state.shown}
              fileName={state.file.name}
              machine={machine}
              isRescaling={state.isRescaling}
              onOther={() => {
                forgetScale();
                cancel();
              }}
            />
          </>
        )}
      </div>
    </Step>
  );
}
