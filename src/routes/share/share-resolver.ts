import { zodResolver } from '@hookform/resolvers/zod';
import { type FieldErrors, type FieldValues, get, type Resolver, set } from 'react-hook-form';
import { detailsOf, type ShareDetails, schemaOf } from './share-details.ts';
import type { ShareMode } from './share-mode.ts';
import type { ShareValues } from './share-values.ts';

/** Where the schema speaks of an id or a code, the form tells what to do. */
const instead: Readonly<Record<string, string>> = {
  kind: 'Choose a kind',
  licence: 'Choose a licence',
  'cut.machineId': 'Choose the machine it was cut on',
  'cut.bit.kind': 'Choose the kind of bit',
  'cut.materialId': 'Choose the material',
  'cut.holdDown': 'Choose how it was held down',
  'cut.outcome': 'Say how it came out',
};

/** The schema of the contract over the form, with the two questions that only the form asks. */
export const shareResolver = (mode: ShareMode): Resolver<ShareValues, unknown, ShareDetails> => {
  const schemaResolver = zodResolver(schemaOf(mode) as never) as unknown as Resolver<
    FieldValues,
    unknown,
    ShareDetails
  >;
  return async (values, context, options) => {
    const result = await schemaResolver(detailsOf(values, mode), context, options as never);
    const errors: FieldErrors<FieldValues> = { ...result.errors };
    for (const [path, message] of Object.entries(instead)) {
      if (get(errors, path) !== undefined) set(errors, path, { type: 'choose', message });
    }
    if (values.isCut === '') {
      errors['isCut'] = { type: 'choose', message: 'Say whether you have cut it' };
    }
    if (values.isCut === 'yes' && values.bitFrom === '') {
      errors['bitFrom'] = { type: 'choose', message: 'Choose a bit of your drawer, or describe another' };
      const cut = errors['cut'] as FieldErrors<FieldValues> | undefined;
      // Its measures are not asked for before it is chosen.
      if (cut !== undefined) delete cut['bit'];
    }
    return Object.keys(errors).length > 0
      ? { values: {}, errors: errors as FieldErrors<ShareValues> }
      : { values: result.values as ShareDetails, errors: {} };
  };
};
