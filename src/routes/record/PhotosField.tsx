import { Camera, ImagePlus, X } from 'lucide-react';
import { useId, useRef } from 'react';
import { Button } from '../../components/Button.tsx';
import { MOST_PHOTOS, type Photos } from './use-photos.ts';

const sizeOf = (bytes: number): string =>
  bytes < 1_000_000 ? `${Math.max(1, Math.round(bytes / 1000))} kB` : `${(bytes / 1_000_000).toFixed(1)} MB`;

/** From the camera or from the files: some phones offer only one of the two behind a single button. */
export function PhotosField({ photos }: { readonly photos: Photos }) {
  const hintId = useId();
  const camera = useRef<HTMLInputElement>(null);
  const files = useRef<HTMLInputElement>(null);
  const take = (input: HTMLInputElement) => {
    photos.add([...(input.files ?? [])]);
    // The same photo may be chosen again after it was taken away.
    input.value = '';
  };
  return (
    <fieldset className="min-w-0 border-t border-ink pt-3" aria-describedby={hintId}>
      <legend className="float-left mb-3 w-full text-lg leading-7 font-bold">Photos</legend>
      <div className="clear-both space-y-3">
        {photos.photos.length > 0 && (
          <ul aria-label="Photos to be sent" className="max-w-xl border-t border-rule">
            {photos.photos.map(({ key, file }) => (
              <li key={key} className="flex items-center gap-3 border-b border-rule">
                <span className="min-w-0 flex-1 truncate">{file.name}</span>
                <span className="figures text-sm whitespace-nowrap text-ink-soft">{sizeOf(file.size)}</span>
                <Button look="quiet" aria-label={`Leave out ${file.name}`} onClick={() => photos.remove(key)}>
                  <X size={18} strokeWidth={1.5} aria-hidden="true" />
                </Button>
              </li>
            ))}
          </ul>
        )}
        {photos.refusals.map((sentence) => (
          <p key={sentence} role="alert" className="text-sm font-semibold text-brick">
            <span aria-hidden="true">✕ </span>
            {sentence}
          </p>
        ))}
        <div className="flex flex-wrap gap-3">
          <Button className="md:hidden" onClick={() => camera.current?.click()}>
            <Camera size={18} strokeWidth={1.5} aria-hidden="true" />
            Take a photo
          </Button>
          <Button onClick={() => files.current?.click()}>
            <ImagePlus size={18} strokeWidth={1.5} aria-hidden="true" />
            Choose photos
          </Button>
        </div>
        <p id={hintId} className="max-w-prose text-sm leading-5 text-ink-soft">
          At most {MOST_PHOTOS}, 10 MB each. Where they were taken is removed. They are sent after the record
          is saved, and are not kept if you leave before that.
        </p>
        <input
          ref={camera}
          type="file"
          accept="image/*"
          capture="environment"
          aria-label="Take a photo"
          tabIndex={-1}
          className="sr-only"
          onChange={(event) => take(event.target)}
        />
        <input
          ref={files}
          type="file"
          accept="image/*"
          multiple
          aria-label="Choose photos"
          tabIndex={-1}
          className="sr-only"
          onChange={(event) => take(event.target)}
        />
      </div>
    </fieldset>
  );
}
