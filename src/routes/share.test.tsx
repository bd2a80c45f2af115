import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { Inspection } from '#shared/api/drawings.ts';
import { machineOf, ownBit } from '../../tests/support/design.ts';
import { answerCalls, listOf, openPage } from '../../tests/support/page.tsx';
import { ConnectionError, ProblemError } from '../api/problem-error.ts';
import { upload } from '../api/upload.ts';
import { Component } from './share.tsx';

vi.mock('../api/upload.ts', () => ({ upload: vi.fn() }));
const sent = vi.mocked(upload);

const machine = machineOf();
const bit = ownBit(6.35);

/** A plate of 400 x 200 user units, of which the file does not say how large they are. */
const inspectionAt = (mmPerUnit: number, confirmed: boolean): Inspection => {
  const boundsMm = { minX: 0, minY: 0, maxX: 400 * mmPerUnit, maxY: 200 * mmPerUnit };
  const reading = (name: 'mm' | '96 an inch' | '90 an inch' | '72 an inch', millimetresPerUnit: number) => ({
    name,
    millimetresPerUnit,
    widthMm: 400 * millimetresPerUnit,
    heightMm: 200 * millimetresPerUnit,
  });
  const layers = [{ key: 'a', name: 'outside', shapeCount: 1, boundsMm }];
  return {
    units: {
      source: confirmed ? 'stated' : 'px',
      millimetresPerUnit: { x: mmPerUnit, y: mmPerUnit },
      confirmed,
    },
    widthMm: boundsMm.maxX,
    heightMm: boundsMm.maxY,
    boundsMm,
    shapeCount: 1,
    segmentCount: 4,
    lengthMm: 1200 * mmPerUnit,
    layers,
    warnings: [{ code: 'text-not-outlines', message: '1 text cannot be cut.', line: 4, column: 7 }],
    scaleReadings: [
      reading('mm', 1),
      reading('96 an inch', 25.4 / 96),
      reading('90 an inch', 25.4 / 90),
      reading('72 an inch', 25.4 / 72),
    ],
    geometry: {
      boundsMm,
      layers,
      hullMm: [
        { x: 0, y: 0 },
        { x: boundsMm.maxX, y: 0 },
        { x: boundsMm.maxX, y: boundsMm.maxY },
        { x: 0, y: boundsMm.maxY },
      ],
      shapes: [
        {
          key: 's',
          layerKey: 'a',
          pathData: `M0 0H${boundsMm.maxX}V${boundsMm.maxY}H0Z`,
          closed: true,
          boundsMm,
          lengthMm: 1200 * mmPerUnit,
        },
      ],
    },
  };
};

type Sent = Parameters<typeof upload>;
const shares = (): Sent[] => sent.mock.calls.filter(([path]) => path === '/api/designs');
let answerShare: () => Promise<unknown>;

beforeEach(() => {
  localStorage.clear();
  answerCalls({
    '/api/auth/get-session': () => ({ session: {} }),
    '/api/me': () => ({ id: 'me', name: 'Wren', email: 'w@x', role: 'member', club: { name: 'Club' } }),
    '/api/machines': () => listOf([machine]),
    '/api/bits': () => listOf([bit]),
  });
  answerShare = async () => ({ slug: 'plate' });
  sent.mockReset();
  sent.mockImplementation(async (path, { parts }) => {
    if (path === '/api/designs') return answerShare();
    const stated = parts?.['millimetresPerUnit'];
    return inspectionAt(stated === undefined ? 25.4 / 96 : Number(stated), stated !== undefined);
  });
});
afterEach(() => vi.unstubAllGlobals());

const open = async () => {
  const page = openPage('/share', Component, '/share');
  await screen.findByRole('heading', { name: 'The drawing' });
  return page;
};
const chooseFile = async () => {
  await userEvent.upload(
    screen.getByLabelText('Drop an SVG here, or paste one', { selector: 'input' }),
    new File(['<svg/>'], 'plate.svg', { type: 'image/svg+xml' }),
  );
  await screen.findByText('How large is it?');
};
const publish = () => userEvent.click(screen.getByRole('button', { name: 'Publish in the loft' }));
const summary = async () =>
  within((await screen.findByText(/things? to change$/i)).parentElement as HTMLElement)
    .getAllByRole('listitem')
    .map((line) => line.textContent);
const fillWords = async () => {
  await userEvent.type(screen.getByLabelText('Title'), 'Plate');
  await userEvent.selectOptions(screen.getByLabelText('Kind'), 'other');
  await userEvent.click(screen.getByRole('radio', { name: /^CC BY 4.0/ }));
};

describe('sharing a design', () => {
  it('asks how large an unsized drawing is, and reads it again at the width that was measured', async () => {
    await open();
    await chooseFile();
    // 25.4/96 mm a unit: 105.8 x 52.9 (CSS Values and Units, S2).
    expect(screen.getByRole('radio', { name: /96 units an inch/ }).closest('label')).toHaveTextContent(
      '105.8 × 52.9 mm, or 4.167 × 2.083 in',
    );
    expect(screen.getByText(/line 4, column 7/)).toBeInTheDocument();
    await userEvent.click(screen.getByRole('radio', { name: /I know its size/ }));
    await userEvent.type(screen.getByLabelText('The whole drawing is so wide'), '8 in');
    await screen.findByText('At the scale you stated.');
    // 8 in = 203.2 mm over 400 units: 0.508 mm a unit.
    expect(Number(sent.mock.calls.at(-1)?.[1].parts?.['millimetresPerUnit'])).toBeCloseTo(0.508, 9);
    expect(screen.getByText('203.2 × 101.6 mm', { selector: 'p' })).toBeInTheDocument();
  });

  it('publishes at no scale that the drawing was not shown at', async () => {
    await open();
    await chooseFile();
    await fillWords();
    await userEvent.click(screen.getByRole('radio', { name: /^Not cut yet/ }));
    await userEvent.click(screen.getByRole('radio', { name: /1 unit is 1 mm/ }));
    await screen.findByText('At the scale you stated.');
    sent.mockImplementation(() => Promise.reject(new ConnectionError()));
    await userEvent.click(screen.getByRole('radio', { name: /72 units an inch/ }));
    expect(await screen.findByText(/could not be read at this scale/)).toBeInTheDocument();
    await publish();
    expect(await summary()).toEqual(['Scale of the drawing: It was not read at this scale: try again']);
    expect(shares()).toEqual([]);
  });

  it('names every wrong field at once, and leads to it', async () => {
    await open();
    await userEvent.click(screen.getByRole('radio', { name: /Yes, with these settings/ }));
    await userEvent.type(screen.getByLabelText('Feed'), '-5');
    await publish();
    expect(await summary()).toEqual([
      'Drawing: Choose the SVG file',
      'Title: Title must not be empty',
      'Kind: Choose a kind',
      'Licence: Choose a licence',
      'Material: Choose the material',
      'Bit: Choose a bit of your drawer, or describe another',
      'Measured thickness: Type a number',
      'Hold-down: Choose how it was held down',
      'Spindle speed: Type a number',
      'Feed: Type a number',
      'Plunge rate: Type a number',
      'Depth of cut: Type a number',
      'Stepover: Type a number',
      'Run time: Type a number',
      'Outcome: Say how it came out',
    ]);
    await userEvent.click(screen.getByRole('button', { name: 'Stepover' }));
    expect(screen.getByLabelText('Stepover')).toHaveFocus();
    expect(shares()).toEqual([]);
  });

  it('sends the settings in millimetres with the bit of the drawer', async () => {
    const { router } = await open();
    await chooseFile();
    await userEvent.click(screen.getByRole('radio', { name: /1 unit is 1 mm/ }));
    await screen.findByText('At the scale you stated.');
    await fillWords();
    await userEvent.type(screen.getByLabelText(/^Tags/), 'plate, wall,');
    await userEvent.click(screen.getByRole('radio', { name: /Yes, with these settings/ }));
    await userEvent.selectOptions(screen.getByLabelText('Bit'), bit.id);
    await userEvent.selectOptions(screen.getByLabelText('Material'), 'plywood');
    await userEvent.selectOptions(screen.getByLabelText('Hold-down'), 'tape');
    await userEvent.click(screen.getByRole('radio', { name: /^Clean/ }));
    const typed = {
      'Measured thickness': '15/32 in',
      'Spindle speed': '18,000',
      Feed: '60 in/min',
      'Plunge rate': '400',
      'Depth of cut': '3',
      Stepover: '2.5',
      'Run time': '1:08',
    };
    for (const [label, text] of Object.entries(typed))
      await userEvent.type(screen.getByLabelText(label), text);
    await publish();
    await waitFor(() => expect(router.state.location.pathname).toBe('/designs/plate'));
    expect(JSON.parse(shares()[0]?.[1].parts?.['details'] ?? '')).toEqual({
      title: 'Plate',
      kind: 'other',
      summary: '',
      licence: 'CC-BY-4.0',
      tags: ['plate', 'wall'],
      scale: { millimetresPerUnit: 1 },
      cut: {
        machineId: machine.id,
        bit: { diameterMm: 6.35, flutes: 2, kind: 'up-cut' },
        materialId: 'plywood',
        stockThicknessMm: 11.90625,
        settings: {
          spindleRpm: 18_000,
          feedMmPerMin: 1524,
          plungeMmPerMin: 400,
          depthOfCutMm: 3,
          stepoverMm: 2.5,
        },
        holdDown: 'tape',
        outcome: 'clean',
        runTimeS: 4080,
        notes: '',
      },
    });
    // Published: the draft is gone.
    expect(Object.keys(localStorage)).toEqual([]);
  });

  it('finds the draft again after a reload', async () => {
    const { unmount } = await open();
    await fillWords();
    await userEvent.type(screen.getByLabelText(/^Tags/), 'plate,');
    await userEvent.click(screen.getByRole('radio', { name: /Yes, with these settings/ }));
    await userEvent.type(screen.getByLabelText('Depth of cut'), '3.5');
    unmount();
    await open();
    expect(screen.getByLabelText('Title')).toHaveValue('Plate');
    expect(screen.getByLabelText('Kind')).toHaveValue('other');
    expect(screen.getByRole('radio', { name: /^CC BY 4.0/ })).toBeChecked();
    expect(screen.getByRole('button', { name: 'Take away the tag plate' })).toBeInTheDocument();
    expect(screen.getByLabelText('Depth of cut')).toHaveValue('3.5');
  });

  it('tries again under the same key, and says what the server found where it can be mended', async () => {
    await open();
    await chooseFile();
    await userEvent.click(screen.getByRole('radio', { name: /1 unit is 1 mm/ }));
    await screen.findByText('At the scale you stated.');
    await fillWords();
    await userEvent.click(screen.getByRole('radio', { name: /^Not cut yet/ }));
    answerShare = () => Promise.reject(new ConnectionError());
    await publish();
    expect(await screen.findByText(/trying again makes no second one/)).toBeInTheDocument();
    answerShare = () =>
      Promise.reject(
        new ProblemError({
          type: 'input.invalid',
          title: 'This cannot be used as it is',
          status: 422,
          detail: 'title',
          requestId: 'r',
          errors: [{ path: 'title', message: 'Title is taken by the club' }],
        }),
      );
    await publish();
    expect(await summary()).toEqual(['Title: Title is taken by the club']);
    const keys = shares().map(([, options]) => options.idempotencyKey);
    expect(keys).toHaveLength(2);
    expect(new Set(keys).size).toBe(1);
  });

  it('refuses more than 10 MB before anything is sent', async () => {
    await open();
    const large = new File(['x'], 'large.svg', { type: 'image/svg+xml' });
    Object.defineProperty(large, 'size', { value: 10 * 1024 * 1024 + 1 });
    await userEvent.upload(
      screen.getByLabelText('Drop an SVG here, or paste one', { selector: 'input' }),
      large,
    );
    expect(await screen.findByText('The file is too large')).toBeInTheDocument();
    expect(sent).not.toHaveBeenCalled();
  });
});
