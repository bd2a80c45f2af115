import type { DecisionAction } from '#shared/api/vocabulary.ts';
import { RadioCards } from '../../components/RadioCards.tsx';
import { decisionWords } from './decision-words.ts';

interface DecisionChoiceProps {
  readonly actions: readonly DecisionAction[];
  readonly value: DecisionAction | null;
  readonly onChoose: (action: DecisionAction) => void;
  readonly error?: string | undefined;
}

/** What a moderator may decide, each with what it does. */
export function DecisionChoice({ actions, value, onChoose, error }: DecisionChoiceProps) {
  return (
    <RadioCards
      legend="Decision"
      name="action"
      value={value ?? ''}
      error={error}
      onChange={(event) => {
        const chosen = actions.find((action) => action === event.target.value);
        if (chosen !== undefined) onChoose(chosen);
      }}
      cards={actions.map((action) => ({
        value: action,
        label: decisionWords[action].label,
        detail: decisionWords[action].detail,
      }))}
    />
  );
}
