import { useEffect, useRef } from 'react';
import { Button } from '../../components/Button.tsx';
import { UploadProgress } from '../../components/UploadProgress.tsx';
import type { ChosenPhoto, Photos } from './use-photos.ts';

interface SendPhotosProps {
  readonly photos: Photos;
  readonly onRetry: () => void;
  readonly onLeave: () => void;
}

const said: Readonly<Record<Exclude<ChosenPhoto['state'], 'sending'>, string>> = {
  waiting: 'waits its turn',
  sent: 'is there',
  refused: 'did not arrive',
};

/** The record is saved; its photos are on their way, and may fail without it. */
export function SendPhotos({ photos, onRetry, onLeave }: SendPhotosProps) {
  const heading = useRef<HTMLHeadingElement>(null);
  // The form with the button that was pressed is gone: the focus comes here.
  useEffect(() => heading.current?.focus(), []);
  const refused = photos.photos.filter(({ state }) => state === 'refused');
  const isSending = photos.photos.some(({ state }) => state === 'sending' || state === 'waiting');
  return (
    <section aria-labelledby="photos-head" className="max-w-2xl space-y-4 border border-ink bg-paper p-5">
      <h2 id="photos-head" ref={heading} tabIndex={-1} className="text-xl leading-7">
        {isSending ? 'The cut is recorded. Its photos are being sent.' : 'The cut is recorded'}
      </h2>
      <ul className="space-y-3">
        {photos.photos.map(({ key, file, state, share, sentence }) => (
          <li key={key}>
            {state === 'sending' ? (
              <UploadProgress name={file.name} share={share} onCancel={undefined} />
            ) : (
              <p>
                <strong className="font-semibold">{file.name}</strong> {said[state]}
              </p>
            )}
            {sentence !== null && (
              <p role="alert" className="text-sm leading-5 font-semibold text-brick">
                <span aria-hidden="true">✕ </span>
                {sentence}
              </p>
            )}
          </li>
        ))}
      </ul>
      {refused.length > 0 && !isSending && (
        <div className="flex flex-wrap gap-3">
          <Button look="main" onClick={onRetry}>
            {refused.length === 1 ? 'Send it again' : `Send ${refused.length} again`}
          </Button>
          <Button onClick={onLeave}>Go to the sheet without</Button>
        </div>
      )}
    </section>
  );
}
