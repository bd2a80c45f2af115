import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import type { Resolver } from 'react-hook-form';
import { type InvitationCreate, type InvitationMade, invitationCreate } from '#shared/api/people.ts';
import { useInvite } from '../../api/invitations.ts';
import { SelectField } from '../../components/SelectField.tsx';
import { TextField } from '../../components/TextField.tsx';
import { roleLabels } from '../../words/labels.ts';
import { optionsOf } from '../../words/options.ts';
import { FormFrame } from '../form/FormFrame.tsx';
import { NumberInput } from '../form/NumberInput.tsx';
import { useSavedForm } from '../form/use-saved-form.ts';
import { MadeLink } from './MadeLink.tsx';

const labels = { role: 'Role', email: 'E-mail', note: 'Note', validDays: 'Days until it runs out' };
const blank: InvitationCreate = { role: 'member', note: '', validDays: 14 };

export function InviteForm() {
  const { mutateAsync } = useInvite();
  const [made, setMade] = useState<InvitationMade | null>(null);
  const saved = useSavedForm<InvitationCreate>({
    resolver: zodResolver(invitationCreate) as Resolver<InvitationCreate, unknown, InvitationCreate>,
    values: blank,
    labels,
    save: async (given) => setMade(await mutateAsync(given)),
    onSaved: () => saved.form.reset(blank),
  });
  const { errorAt, form } = saved;
  return (
    <div className="space-y-4">
      {made !== null && <MadeLink key={made.id} made={made} />}
      <FormFrame saved={saved} does="Make an invitation link">
        <div className="grid items-start gap-4 sm:grid-cols-2 lg:grid-cols-4">
          <SelectField
            label="Role"
            options={optionsOf(roleLabels)}
            error={errorAt('role')}
            {...form.register('role')}
          />
          <NumberInput
            saved={saved}
            name="validDays"
            label="Days until it runs out"
            quantity={{ unit: 'days' }}
            hint="1 to 60"
          />
          <TextField
            label="E-mail"
            type="email"
            isOptional
            hint="The link goes there by mail too"
            error={errorAt('email')}
            {...form.register('email', {
              setValueAs: (text: string) => (text.trim() === '' ? undefined : text.trim()),
            })}
          />
          <TextField
            label="Note"
            isOptional
            hint="For the list below: who it is for"
            error={errorAt('note')}
            {...form.register('note')}
          />
        </div>
      </FormFrame>
    </div>
  );
}
