import type { Material, Outcome } from '#shared/api/vocabulary.ts';
import { materialLabels, outcomeLabels } from '../../words/labels.ts';

/** What the member looks for in the log. It lives in the address, under the names of `GET /api/cuts`. */
export interface LogFilters {
  readonly whose: 'mine' | 'club';
  readonly material: Material | null;
  readonly outcome: Outcome | null;
  /** One of my machines; only among my own cuts. */
  readonly machineId: string | null;
}

const codeIn = <Code extends string>(
  labels: Readonly<Record<Code, string>>,
  text: string | null,
): Code | null => (text !== null && Object.hasOwn(labels, text) ? (text as Code) : null);

const idPattern = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i;

/** Reads the address; what it does not understand is left out, so that an old link still opens. */
export const logFiltersFrom = (params: URLSearchParams): LogFilters => {
  const whose = params.get('whose') === 'club' ? 'club' : 'mine';
  const machineId = params.get('machineId');
  return {
    whose,
    material: codeIn(materialLabels, params.get('material')),
    outcome: codeIn(outcomeLabels, params.get('outcome')),
    machineId: whose === 'mine' && machineId !== null && idPattern.test(machineId) ? machineId : null,
  };
};

const set = ({ material, outcome, machineId }: LogFilters): URLSearchParams => {
  const params = new URLSearchParams();
  for (const [name, value] of Object.entries({ material, outcome, machineId })) {
    if (value !== null) params.set(name, value);
  }
  return params;
};

/** The address for these filters; what is not set is left out, and the log opens with my own cuts. */
export const logParamsOf = (filters: LogFilters): URLSearchParams => {
  const params = set(filters);
  if (filters.whose === 'club') {
    params.delete('machineId');
    params.set('whose', 'club');
  }
  return params;
};

/** What is asked of the server, for the list and for the CSV alike. */
export const logSearchOf = (filters: LogFilters): string => {
  const params = logParamsOf(filters);
  params.set('whose', filters.whose);
  return params.toString();
};

export const isFiltered = ({ material, outcome, machineId }: LogFilters): boolean =>
  material !== null || outcome !== null || machineId !== null;
