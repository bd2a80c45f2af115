import type { FitReport } from '#shared/api/fit.ts';
import { type Check, type FitContext, notKnown } from './check.ts';
import { checkBed } from './checks/bed.ts';
import { checkBit } from './checks/bit.ts';
import { checkCuttingLength } from './checks/cutting-length.ts';
import { checkFeed } from './checks/feed.ts';
import { checkOpening } from './checks/opening.ts';
import { checkPlunge } from './checks/plunge.ts';
import { checkReach } from './checks/reach.ts';
import { checkRunTime } from './checks/run-time.ts';
import { checkShank } from './checks/shank.ts';
import { checkSpindle } from './checks/spindle.ts';
import { checkStock, checkStockThickness } from './checks/stock.ts';
import { checkZTravel } from './checks/z-travel.ts';
import { type ChosenBit, chooseBit } from './choose-bit.ts';
import type { FitBit, FitInput } from './fit-input.ts';
import { fitPractice } from './practice.ts';
import { nearestSpeed } from './spindle-choice.ts';
import { verdictOf } from './verdict.ts';
import { wordingIn } from './wording.ts';

const NO_CUT = 'nobody has shared a cut of it';

const stockChecks = (context: FitContext): Check[] => {
  const { stock, stockThicknessMm } = context;
  if (stock === undefined) return [];
  return [
    checkStock(context, stock),
    ...(stockThicknessMm === undefined ? [] : [checkStockThickness(context, stock, stockThicknessMm)]),
  ];
};

const bitChecks = (context: FitContext, chosen: ChosenBit | undefined): Check[] => {
  if (context.bit === undefined) {
    return ['bit', 'cutting-length', 'shank'].map((id) => notKnown(id, 'mm', NO_CUT));
  }
  const onTheBit =
    chosen?.usable === true
      ? [checkCuttingLength(context, chosen.bit), checkShank(context, chosen.bit)]
      : ['cutting-length', 'shank'].map((id) => notKnown(id, 'mm', 'this depends on the bit you would use'));
  return [checkBit(context, context.bit, chosen), ...onTheBit];
};

const settingsChecks = (context: FitContext, bit: FitBit | undefined): Check[] => {
  const { settings, machine } = context;
  if (settings === undefined) {
    return [
      notKnown('spindle', 'rev/min', NO_CUT),
      notKnown('feed', 'mm/min', NO_CUT),
      notKnown('plunge', 'mm/min', NO_CUT),
    ];
  }
  const choice = nearestSpeed(machine.spindle, settings.spindleRpm, bit?.maxRpm);
  return [
    checkSpindle(context, settings, bit, choice),
    checkFeed(context, settings, bit, choice),
    checkPlunge(context, settings, bit, choice),
  ];
};

const publicCheck = ({ clause: _clause, ...check }: Check): FitReport['checks'][number] => check;

/**
 * Whether a design can be made on a member's bench, check by check with the figures (mm, mm/min,
 * rev/min, s), the worst of them as the verdict in one sentence, and how to turn the drawing. Pure:
 * the same in the browser and in the server. The outline is taken as cut round its outside by the
 * shared cut's bit. `bits` are the bits to choose from; `stock` and the run time are checked when given.
 */
export const fitReport = (input: FitInput): FitReport => {
  const context: FitContext = {
    ...input,
    wording: wordingIn(input.units ?? 'mm'),
    practice: input.practice ?? fitPractice,
  };
  const chosen = context.bit === undefined ? undefined : chooseBit(context, context.bit);
  const bit = chosen?.usable === true ? chosen.bit : undefined;
  const { check: bed, turnDeg } = checkBed(context);
  const others = [
    ...stockChecks(context),
    ...bitChecks(context, chosen),
    checkZTravel(context),
    checkOpening(context, bit),
    checkReach(context, bit),
    ...settingsChecks(context, bit),
    ...(context.runTimeLimitS === undefined ? [] : [checkRunTime(context, context.runTimeLimitS)]),
  ];
  const neverCut = context.bit === undefined && context.settings === undefined;
  return {
    ...verdictOf(bed, others, neverCut),
    checks: [bed, ...others].map(publicCheck),
    turnDeg,
  };
};
