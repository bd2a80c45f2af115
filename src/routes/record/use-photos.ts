import { useState } from 'react';
import { addPhoto } from '../../api/cuts.ts';
import { sentenceOf } from '../../api/problem-error.ts';
import { newIdempotencyKey } from '../../api/request.ts';

export interface ChosenPhoto {
  readonly key: string;
  readonly file: File;
  readonly state: 'waiting' | 'sending' | 'sent' | 'refused';
  /** 0 to 1 while it is on its way. */
  readonly share: number;
  /** Why it was refused. */
  readonly sentence: string | null;
}

const MOST_BYTES = 10 * 1024 * 1024;
export const MOST_PHOTOS = 8;

/** What can be told before anything is sent. */
const refusalOf = ({ size, type, name }: File): string | null => {
  if (size > MOST_BYTES) return `${name} is larger than 10 MB. Take it at a lower resolution.`;
  return type !== '' && !type.startsWith('image/') ? `${name} is not a photo.` : null;
};

/** Photos are chosen with the record and sent once it is made: a record without them is better than none. */
export const usePhotos = () => {
  const [photos, setPhotos] = useState<readonly ChosenPhoto[]>([]);
  const [refusals, setRefusals] = useState<readonly string[]>([]);

  const change = (key: string, next: Partial<ChosenPhoto>) =>
    setPhotos((before) => before.map((photo) => (photo.key === key ? { ...photo, ...next } : photo)));

  const add = (files: readonly File[]) => {
    const room = MOST_PHOTOS - photos.length;
    const fit = files.filter((file) => refusalOf(file) === null);
    setRefusals([
      ...files.map(refusalOf).filter((sentence) => sentence !== null),
      ...(fit.length > room ? [`At most ${MOST_PHOTOS} photos go with a record.`] : []),
    ]);
    const taken = fit.slice(0, room).map((file): ChosenPhoto => {
      return { key: newIdempotencyKey(), file, state: 'waiting', share: 0, sentence: null };
    });
    setPhotos((before) => [...before, ...taken]);
  };

  /** Sends what has not arrived, one after the other; true when all did. */
  const send = async (cutId: string): Promise<boolean> => {
    let areAllSent = true;
    for (const { key, file, state } of photos) {
      if (state === 'sent') continue;
      change(key, { state: 'sending', share: 0, sentence: null });
      try {
        const onProgress = (share: number) => change(key, { share });
        await addPhoto({ cutId, file, idempotencyKey: key, onProgress });
        change(key, { state: 'sent', share: 1 });
      } catch (error) {
        areAllSent = false;
        change(key, { state: 'refused', sentence: sentenceOf(error) });
      }
    }
    return areAllSent;
  };

  return {
    photos,
    refusals,
    add,
    remove: (key: string) => setPhotos((before) => before.filter((photo) => photo.key !== key)),
    send,
  };
};
export type Photos = ReturnType<typeof usePhotos>;
