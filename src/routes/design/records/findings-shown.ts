import type { ComponentProps } from 'react';
import type { Finding } from '#shared/api/findings.ts';
import { trimmed } from '#shared/units/figures.ts';
import type { Findings } from '../../../components/Findings.tsx';

type Shown = ComponentProps<typeof Findings>['findings'][number];

const figuresOf = ({ figures }: Finding): string | undefined =>
  figures.length === 0
    ? undefined
    : figures.map(({ name, value, unit }) => `${name} ${trimmed(value, 3)} ${unit}`.trimEnd()).join(', ');

/** What the rules found, as notes on a drawing are shown: the sentence with what to change. */
export const findingsShown = (findings: readonly Finding[]): readonly Shown[] =>
  findings.map((finding) => ({
    level: finding.level === 'do-not-cut' ? 'doNotCut' : finding.level,
    sentence: [finding.sentence, finding.advice].filter((part) => part !== '').join(' '),
    figures: figuresOf(finding),
    source: finding.source,
  }));
