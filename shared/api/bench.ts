import { z } from 'zod';
import { above0, from0, id, listOf, timestamp, version, wholeNumber, words } from './primitives.ts';
import { bitKind, machineClass, materialFamily } from './vocabulary.ts';

export const spindle = z.discriminatedUnion('kind', [
  z
    .strictObject({
      kind: z.literal('range'),
      minRpm: above0(120_000, 'Slowest spindle speed', 'rev/min'),
      maxRpm: above0(120_000, 'Fastest spindle speed', 'rev/min'),
    })
    .refine((range) => range.minRpm <= range.maxRpm, {
      path: ['minRpm'],
      message: 'Slowest spindle speed must not be above the fastest',
    }),
  z.strictObject({
    kind: z.literal('dial'),
    positionsRpm: z
      .array(above0(120_000, 'Dial position', 'rev/min'))
      .min(1, 'Name at least one dial position')
      .max(20, 'Name at most 20 dial positions'),
  }),
]);
export type Spindle = z.infer<typeof spindle>;

const marginMm = z.strictObject({
  left: from0(1000, 'Left margin', 'mm'),
  right: from0(1000, 'Right margin', 'mm'),
  front: from0(1000, 'Front margin', 'mm'),
  back: from0(1000, 'Back margin', 'mm'),
});

const machineFields = {
  name: words(60, 'Name'),
  class: machineClass,
  bedXMm: above0(10_000, 'Bed length (X)', 'mm'),
  bedYMm: above0(10_000, 'Bed width (Y)', 'mm'),
  marginMm,
  /** Width lost to clamps along the front edge. */
  clampStripMm: from0(1000, 'Clamp strip', 'mm'),
  zTravelMm: above0(1000, 'Z travel', 'mm'),
  /** Free height under the collet with Z at the top. */
  openingMm: above0(1000, 'Opening under the collet', 'mm'),
  maxFeedMmPerMin: above0(60_000, 'Greatest feed', 'mm/min'),
  maxPlungeMmPerMin: above0(30_000, 'Greatest plunge rate', 'mm/min'),
  rapidMmPerMin: above0(100_000, 'Rapid speed', 'mm/min'),
  /** Absent: the default of the machine's class stands in, and is named as such. */
  accelerationMmPerS2: above0(50_000, 'Acceleration', 'mm/s²').optional(),
  spindle,
  spindlePowerW: above0(30_000, 'Spindle power', 'W'),
  colletsMm: z
    .array(above0(50, 'Collet', 'mm'))
    .min(1, 'Name at least one collet')
    .max(20, 'Name at most 20 collets'),
};

const machineMakesSense = <Schema extends z.ZodType<z.infer<z.ZodObject<typeof machineFields>>>>(
  schema: Schema,
) =>
  schema
    .refine((machine) => machine.marginMm.left + machine.marginMm.right < machine.bedXMm, {
      path: ['marginMm', 'left'],
      message: 'The left and right margins together must leave some of the bed length (X)',
    })
    .refine(
      (machine) => machine.marginMm.front + machine.marginMm.back + machine.clampStripMm < machine.bedYMm,
      {
        path: ['marginMm', 'front'],
        message:
          'The front and back margins and the clamp strip together must leave some of the bed width (Y)',
      },
    );
export const machineCreate = machineMakesSense(z.strictObject(machineFields));
/** A change sends the whole machine with the version it was read at. */
export const machineChange = machineMakesSense(z.strictObject({ ...machineFields, version }));
export type MachineCreate = z.infer<typeof machineCreate>;

export const machine = z.object({ id, version, createdAt: timestamp, ...machineFields });
export type Machine = z.infer<typeof machine>;
export const machineList = listOf(machine);

const bitFields = {
  name: words(60, 'Name'),
  kind: bitKind,
  diameterMm: above0(100, 'Cutting diameter', 'mm'),
  shankMm: above0(50, 'Shank', 'mm'),
  flutes: wholeNumber(1, 12, 'Flutes'),
  cuttingLengthMm: above0(200, 'Cutting length', 'mm'),
  canPlunge: z.boolean({ error: 'Say whether the end of the bit can plunge' }),
  /** The greatest speed marked on the bit; absent when it carries no mark. */
  maxRpm: above0(120_000, 'Marked greatest speed', 'rev/min').optional(),
  /** Included angle of a V-bit. */
  angleDeg: above0(179, 'Included angle', 'degrees').optional(),
};

const bitMakesSense = <Schema extends z.ZodType<z.infer<z.ZodObject<typeof bitFields>>>>(schema: Schema) =>
  schema.refine((bit) => bit.kind !== 'v-bit' || bit.angleDeg !== undefined, {
    path: ['angleDeg'],
    message: 'A V-bit needs its included angle in degrees',
  });
export const bitCreate = bitMakesSense(z.strictObject(bitFields));
export const bitChange = bitMakesSense(z.strictObject({ ...bitFields, version }));
export type BitCreate = z.infer<typeof bitCreate>;
export const bit = z.object({ id, version, createdAt: timestamp, ...bitFields });
export type Bit = z.infer<typeof bit>;
export const bitList = listOf(bit);

const stockFields = {
  name: words(60, 'Name'),
  materialId: materialFamily,
  lengthMm: above0(10_000, 'Length', 'mm'),
  widthMm: above0(10_000, 'Width', 'mm'),
  /** Measured, not nominal. */
  thicknessMm: above0(300, 'Measured thickness', 'mm'),
};
export const stockCreate = z.strictObject(stockFields);
export const stockChange = z.strictObject({ ...stockFields, version });
export type StockCreate = z.infer<typeof stockCreate>;
export const stock = z.object({ id, version, createdAt: timestamp, ...stockFields });
export type Stock = z.infer<typeof stock>;
export const stockList = listOf(stock);
