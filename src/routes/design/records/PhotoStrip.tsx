import { useState } from 'react';
import type { CutRecord } from '#shared/api/cuts.ts';
import { photoHref } from '../../../api/cuts.ts';
import { Button } from '../../../components/Button.tsx';
import { Dialog } from '../../../components/Dialog.tsx';

interface PhotoStripProps {
  readonly photos: CutRecord['photos'];
  /** Whose cut it is, for who cannot see it. */
  readonly of: string;
}

/** Thumbnails that open large, one after the other. */
export function PhotoStrip({ photos, of }: PhotoStripProps) {
  const [opened, setOpened] = useState<number | null>(null);
  const shown = opened === null ? undefined : photos[opened];
  const nameOf = (place: number) => `Photo ${place + 1} of ${photos.length}, ${of}`;
  const step = (by: number) => setOpened(((opened ?? 0) + by + photos.length) % photos.length);
  return (
    <>
      <ul className="flex flex-wrap gap-2">
        {photos.map(({ id, widthPx, heightPx }, place) => (
          <li key={id}>
            <button
              type="button"
              onClick={() => setOpened(place)}
              aria-label={`Open ${nameOf(place)}`}
              className="block border border-ink bg-film p-0.5 hover:border-layout"
            >
              <img
                src={photoHref(id)}
                alt=""
                width={widthPx}
                height={heightPx}
                loading="lazy"
                className="size-20 object-cover"
              />
            </button>
          </li>
        ))}
      </ul>
      <Dialog
        title={opened === null ? '' : nameOf(opened)}
        isOpen={shown !== undefined}
        onClose={() => setOpened(null)}
        actions={
          photos.length > 1 && (
            <>
              <Button onClick={() => step(-1)}>Previous</Button>
              <Button onClick={() => step(1)}>Next</Button>
            </>
          )
        }
      >
        {shown !== undefined && opened !== null && (
          <img
            src={photoHref(shown.id)}
            alt={of}
            width={shown.widthPx}
            height={shown.heightPx}
            className="mx-auto h-auto max-h-[70dvh] w-auto max-w-full"
          />
        )}
      </Dialog>
    </>
  );
}
