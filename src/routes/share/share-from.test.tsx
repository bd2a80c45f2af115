import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { Design } from '#shared/api/designs.ts';
import type { Inspection } from '#shared/api/drawings.ts';
import { machineOf, ownBit } from '../../../tests/support/design.ts';
import { answerCalls, listOf, openPage } from '../../../tests/support/page.tsx';
import { sheetOf } from '../../../tests/support/review.ts';
import { upload } from '../../api/upload.ts';
import { Component } from '../share.tsx';

vi.mock('../../api/upload.ts', () => ({ upload: vi.fn() }));
const sent = vi.mocked(upload);

const boundsMm = { minX: 0, minY: 0, maxX: 80, maxY: 40 };
const layers = [{ key: 'a', name: 'outside', shapeCount: 1, boundsMm }];
const read: Inspection = {
  units: { source: 'mm', millimetresPerUnit: { x: 1, y: 1 }, confirmed: true },
  widthMm: 80,
  heightMm: 40,
  boundsMm,
  shapeCount: 1,
  segmentCount: 4,
  lengthMm: 240,
  layers,
  warnings: [],
  scaleReadings: [],
  geometry: {
    boundsMm,
    layers,
    hullMm: [
      { x: 0, y: 0 },
      { x: 80, y: 0 },
      { x: 80, y: 40 },
    ],
    shapes: [{ key: 's', layerKey: 'a', pathData: 'M0 0H80V40H0Z', closed: true, boundsMm, lengthMm: 240 }],
  },
};
const bit = ownBit(6.35);
const machine = machineOf();

beforeEach(() => {
  localStorage.clear();
  sent.mockReset();
  sent.mockImplementation(async (path) => (path === '/api/drawings/inspect' ? read : { slug: 'made' }));
});
afterEach(() => vi.unstubAllGlobals());

const licensed = (licence: Design['licence'], change: Partial<Design> = {}): Design => {
  const design = sheetOf(change);
  const [first] = design.revisions;
  return {
    ...design,
    licence,
    revision: { ...design.revision, licence },
    revisions: first === undefined ? [] : [{ ...first, licence }],
  };
};

const open = async (at: string, designs: readonly Design[], myId = 'me') => {
  answerCalls({
    '/api/auth/get-session': () => ({ session: {} }),
    '/api/me': () => ({ id: myId, name: 'Me', email: 'm@x', role: 'member', club: { name: 'Club' } }),
    '/api/machines': () => listOf([machine]),
    '/api/bits': () => listOf([bit]),
    ...Object.fromEntries(designs.map((design) => [`/api/designs/${design.slug}`, () => design])),
  });
  const page = openPage('/share', Component, at);
  await screen.findByRole('heading', { level: 1, name: /Wedge|No / });
  return page;
};
const licences = () =>
  within(screen.getByRole('group', { name: /^Licence/ }))
    .getAllByRole<HTMLInputElement>('radio')
    .map(({ value }) => value);
const chooseFile = async () => {
  await userEvent.upload(
    screen.getByLabelText('Drop an SVG here, or paste one', { selector: 'input' }),
    new File(['<svg/>'], 'plate.svg', { type: 'image/svg+xml' }),
  );
  await screen.findByText('80.0 × 40.0 mm', { selector: 'p' });
};
const details = (path: string): unknown => {
  const call = sent.mock.calls.find(([to]) => to === path);
  return JSON.parse(call?.[1].parts?.['details'] ?? 'null');
};

describe('sharing a remix', () => {
  it.each<[Design['licence'], Design['licence'][]]>([
    // Share-alike binds what is made from it (CC BY-SA 4.0, section 3(b)).
    ['CC-BY-SA-4.0', ['CC-BY-SA-4.0']],
    ['CC-BY-NC-4.0', ['CC-BY-NC-4.0', 'CC-BY-NC-SA-4.0', 'CC-BY-NC-ND-4.0']],
    ['CERN-OHL-W-2.0', ['CERN-OHL-W-2.0', 'CERN-OHL-S-2.0']],
  ])('of a design under %s offers only what that allows, and says why', async (licence, allowed) => {
    await open('/share?remixOf=wedge&revision=1', [licensed(licence)]);
    expect(licences()).toEqual(allowed);
    expect(screen.getByText(/^“Wedge” is under/)).toBeInTheDocument();
  });

  it('of a design that may not be changed is not begun', async () => {
    await open('/share?remixOf=wedge&revision=1', [licensed('CC-BY-ND-4.0')]);
    expect(screen.getByText(/allows no changed copies to be shared\. Ask Wren/)).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: 'Publish the remix' })).toBeNull();
  });

  it('of a withheld design is not begun, and says why', async () => {
    const withheld = { reason: 'Too thin.' };
    const [first] = sheetOf().revisions;
    const revisions = first === undefined ? [] : [{ ...first, withheld }];
    await open('/share?remixOf=wedge&revision=1', [sheetOf({ withheld, revisions })]);
    expect(screen.getByText(/cannot be remixed\. The reason: Too thin\./)).toBeInTheDocument();
  });

  it('of my own design may carry any licence', async () => {
    await open('/share?remixOf=wedge&revision=1', [licensed('CC-BY-SA-4.0')], 'wren');
    expect(licences()).toHaveLength(10);
  });

  it('names its parent revision and what changed', async () => {
    const { router } = await open('/share?remixOf=wedge&revision=1', [licensed('CC-BY-SA-4.0')]);
    expect(screen.getByLabelText('Title')).toHaveValue('Wedge, remixed');
    await chooseFile();
    await userEvent.click(screen.getByRole('radio', { name: /^Not cut yet/ }));
    await userEvent.click(screen.getByRole('button', { name: 'Publish the remix' }));
    expect(await screen.findByText('Change note must not be empty')).toBeInTheDocument();
    await userEvent.type(screen.getByLabelText('Change note'), 'Longer');
    await userEvent.click(screen.getByRole('button', { name: 'Publish the remix' }));
    await waitFor(() => expect(router.state.location.pathname).toBe('/designs/made'));
    expect(details('/api/designs/wedge/remixes')).toEqual({
      title: 'Wedge, remixed',
      kind: 'hold-downs',
      summary: '',
      tags: [],
      licence: 'CC-BY-SA-4.0',
      changeNote: 'Longer',
      parentRevision: 1,
    });
  });
});

describe('issuing a revision', () => {
  const parent = {
    slug: 'stop',
    revision: 1,
    title: 'Stop',
    drawingNumber: 'ML-0003',
    ownerName: 'Fern',
  };
  const byFern = licensed('CC-BY-4.0', { slug: 'stop', title: 'Stop', owner: { id: 'fern', name: 'Fern' } });

  it('asks no words and keeps the licence', async () => {
    await open('/share?revisionOf=wedge', [licensed('CC-BY-SA-4.0')], 'wren');
    expect(screen.getByRole('heading', { level: 1, name: 'Revision 2 of Wedge' })).toBeInTheDocument();
    expect(screen.queryByLabelText('Title')).toBeNull();
    expect(screen.getByRole('radio', { name: /^CC BY-SA 4.0/ })).toBeChecked();
    await chooseFile();
    await userEvent.type(screen.getByLabelText('Change note'), 'Wider');
    await userEvent.click(screen.getByRole('radio', { name: /^Not cut yet/ }));
    await userEvent.click(screen.getByRole('button', { name: 'Issue revision 2' }));
    await waitFor(() =>
      expect(details('/api/designs/wedge/revisions')).toEqual({
        changeNote: 'Wider',
        licence: 'CC-BY-SA-4.0',
      }),
    );
  });

  it('of a remix offers what the original by somebody else allows', async () => {
    await open('/share?revisionOf=wedge', [licensed('CC-BY-4.0', { parent }), byFern], 'wren');
    expect(licences()).not.toContain('CC0-1.0');
    expect(licences()).toContain('CC-BY-SA-4.0');
    expect(screen.getByText(/^“Stop” is under CC BY 4.0/)).toBeInTheDocument();
  });

  it('is for the uploader only', async () => {
    await open('/share?revisionOf=wedge', [sheetOf()]);
    expect(screen.getByText(/Only its uploader issues new revisions/)).toBeInTheDocument();
  });
});

describe('settings that a rule stops', () => {
  it('are told of before publishing, and the drawing can be published without them', async () => {
    await open('/share?revisionOf=wedge', [sheetOf()], 'wren');
    await chooseFile();
    await userEvent.type(screen.getByLabelText('Change note'), 'Wider');
    await userEvent.click(screen.getByRole('radio', { name: /Yes, with these settings/ }));
    await userEvent.selectOptions(screen.getByLabelText('Bit'), bit.id);
    await userEvent.selectOptions(screen.getByLabelText('Material'), 'pvc');
    await userEvent.selectOptions(screen.getByLabelText('Hold-down'), 'tape');
    const typed = {
      'Measured thickness': '6',
      'Spindle speed': '18000',
      Feed: '1500',
      'Plunge rate': '400',
      'Depth of cut': '2',
      Stepover: '2.5',
      'Run time': '10',
    };
    for (const [label, text] of Object.entries(typed))
      await userEvent.type(screen.getByLabelText(label), text);
    await userEvent.tab();
    expect(await screen.findByText('These settings will wait for a moderator.')).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Issue revision 2, settings to wait' })).toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'Publish without the settings' }));
    await waitFor(() =>
      expect(details('/api/designs/wedge/revisions')).toEqual({ changeNote: 'Wider', licence: 'CC-BY-4.0' }),
    );
  });
});
