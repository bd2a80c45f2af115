import type { CutRecord } from '#shared/api/cuts.ts';
import { type CsvCell, csvText } from './csv.ts';

/** Settings that a moderator withheld are not handed out: their cells stay empty, and a column says why. */
const ofSettings =
  (cell: (settings: CutRecord['settings']) => number) =>
  ({ settings, settingsWithheld }: CutRecord): CsvCell =>
    settingsWithheld === undefined ? cell(settings) : undefined;

/** One column each: its name with the unit in it, and its cell. */
const columns: readonly (readonly [name: string, cell: (record: CutRecord) => CsvCell])[] = [
  ['cut_on', ({ cutOn }) => cutOn],
  ['drawing_number', ({ design }) => design.drawingNumber],
  ['design', ({ design }) => design.title],
  ['revision', ({ revision }) => revision],
  ['member', ({ member }) => member.name],
  ['machine', ({ machine }) => machine.name],
  ['bed_x_mm', ({ machine }) => machine.bedXMm],
  ['bed_y_mm', ({ machine }) => machine.bedYMm],
  ['bit_kind', ({ bit }) => bit.kind],
  ['bit_diameter_mm', ({ bit }) => bit.diameterMm],
  ['bit_flutes', ({ bit }) => bit.flutes],
  ['material', ({ materialId }) => materialId],
  ['stock_thickness_mm', ({ stockThicknessMm }) => stockThicknessMm],
  ['spindle_rev_per_min', ofSettings(({ spindleRpm }) => spindleRpm)],
  ['feed_mm_per_min', ofSettings(({ feedMmPerMin }) => feedMmPerMin)],
  ['plunge_mm_per_min', ofSettings(({ plungeMmPerMin }) => plungeMmPerMin)],
  ['depth_of_cut_mm', ofSettings(({ depthOfCutMm }) => depthOfCutMm)],
  ['stepover_mm', ofSettings(({ stepoverMm }) => stepoverMm)],
  ['settings_withheld', ({ settingsWithheld }) => settingsWithheld?.reason],
  ['feed_override_percent', ({ overridePercent }) => overridePercent],
  ['hold_down', ({ holdDown }) => holdDown],
  ['outcome', ({ outcome }) => outcome],
  ['run_time_s', ({ runTimeS }) => runTimeS],
  ['went_wrong', ({ wentWrong }) => wentWrong.join('; ')],
  ['drawn_mm', ({ measured }) => measured.map(({ drawnMm }) => drawnMm).join('; ')],
  ['measured_mm', ({ measured }) => measured.map(({ measuredMm }) => measuredMm).join('; ')],
  ['in_service', ({ inService }) => inService?.result],
  ['in_service_notes', ({ inService }) => inService?.notes],
  ['in_service_noted_at_utc', ({ inService }) => inService?.notedAt],
  ['notes', ({ notes }) => notes],
  ['photos', ({ photos }) => photos.length],
  ['recorded_at_utc', ({ createdAt }) => createdAt],
  ['corrected_at_utc', ({ correctedAt }) => correctedAt],
  ['record_id', ({ id }) => id],
];

/** The cut log as CSV with a header row: lengths mm, speeds mm/min and rev/min, times s, instants UTC. */
export const cutLogCsv = (records: readonly CutRecord[]): string =>
  csvText([
    columns.map(([name]) => name),
    ...records.map((record) => columns.map(([, cell]) => cell(record))),
  ]);
