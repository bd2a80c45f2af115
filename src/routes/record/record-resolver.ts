import { zodResolver } from '@hookform/resolvers/zod';
import { type FieldErrors, type FieldValues, get, type Resolver, set } from 'react-hook-form';
import { cutCorrection } from '#shared/api/cuts.ts';
import { givenOf, type RecordValues } from './record-values.ts';

const schemaResolver = zodResolver(cutCorrection) as unknown as Resolver<FieldValues, unknown, FieldValues>;

/** Where the schema speaks of an id or a code, the form tells what to do. */
const instead: Readonly<Record<string, string>> = {
  machineId: 'Choose the machine it was cut on',
  'bit.kind': 'Choose the kind of bit',
  materialId: 'Choose the material',
  holdDown: 'Choose how it was held down',
  outcome: 'Say how it came out',
};

/** The schema of the contract over the form. The fields are the same for a new record and for a correction. */
export const recordResolver: Resolver<RecordValues, unknown, RecordValues> = async (
  values,
  context,
  options,
) => {
  const checked = { ...givenOf(values), version: 1 };
  const result = await schemaResolver(checked, context, options as never);
  const errors: FieldErrors<FieldValues> = { ...result.errors };
  for (const [path, message] of Object.entries(instead)) {
    if (get(errors, path) !== undefined) set(errors, path, { type: 'choose', message });
  }
  if (values.bitFrom === '') {
    // Its measures are not asked for before it is chosen.
    delete errors['bit'];
    errors['bitFrom'] = { type: 'choose', message: 'Choose a bit of your drawer, or describe another' };
  }
  return Object.keys(errors).length > 0
    ? { values: {}, errors: errors as FieldErrors<RecordValues> }
    : { values, errors: {} };
};
