import { type FormEvent, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import type { Bit } from '#shared/api/bench.ts';
import { isProblem, sentenceOf } from '../../api/problem-error.ts';
import { Button } from '../../components/Button.tsx';
import { CheckField } from '../../components/CheckField.tsx';
import { LinkButton } from '../../components/LinkButton.tsx';
import { PageTitle } from '../../components/PageTitle.tsx';
import { ProblemNote } from '../../components/ProblemNote.tsx';
import { useUnits } from '../../units/units-context.tsx';
import { sayBit } from '../bench/bit/say-bit.ts';
import { commonBits } from './common-bits.ts';
import { useFillDrawer } from './use-fill-drawer.ts';

/** A quick start for the bit drawer; exact bits are entered on the bench. */
export function FirstBits({ owned }: { readonly owned: readonly Bit[] }) {
  const { system } = useUnits();
  const navigate = useNavigate();
  const [chosen, setChosen] = useState<ReadonlySet<string>>(new Set());
  const { fill, isFilling, failure } = useFillDrawer();
  const isOwned = (name: string) => owned.some((bit) => bit.name === name);
  const choose = (name: string, isChosen: boolean) =>
    setChosen((before) => {
      const names = new Set(before);
      if (isChosen) names.add(name);
      else names.delete(name);
      return names;
    });
  const submit = async (event: FormEvent) => {
    event.preventDefault();
    const wanted = commonBits.filter(({ name }) => chosen.has(name));
    if (await fill(wanted, ({ name }) => choose(name, false))) void navigate('/');
  };
  return (
    <form onSubmit={(event) => void submit(event)} className="max-w-4xl space-y-6">
      <div className="space-y-2">
        <p className="label-narrow text-ink-soft">Step 2 of 2</p>
        <PageTitle>Bits in your drawer</PageTitle>
        <p className="max-w-prose text-ink-soft">
          Tick those you own. Cutting lengths and flutes are common practice (P); set your own on the bench.
        </p>
      </div>
      {failure !== null && (
        <ProblemNote
          problem={isProblem(failure) ? failure.problem : { title: 'Not added', detail: sentenceOf(failure) }}
        />
      )}
      <fieldset className="min-w-0">
        <legend className="sr-only">Common bits</legend>
        <div className="grid gap-x-8 md:grid-cols-2">
          {commonBits.map((bit) => (
            <div key={bit.name} className="border-b border-rule py-2">
              <CheckField
                label={
                  <>
                    <span className="font-semibold">{bit.name}</span>
                    <span className="figures block text-sm leading-5 text-ink-soft">
                      {isOwned(bit.name) ? 'in your drawer' : sayBit(bit, system)}
                    </span>
                  </>
                }
                checked={chosen.has(bit.name) || isOwned(bit.name)}
                disabled={isOwned(bit.name)}
                onChange={(event) => choose(bit.name, event.target.checked)}
              />
            </div>
          ))}
        </div>
      </fieldset>
      <div className="flex flex-wrap gap-3 border-t border-ink pt-4">
        <Button look="main" type="submit" disabled={isFilling || chosen.size === 0}>
          {isFilling
            ? 'Adding…'
            : chosen.size === 0
              ? 'Add bits'
              : `Add ${chosen.size} ${chosen.size === 1 ? 'bit' : 'bits'}`}
        </Button>
        <LinkButton look="line" to="/">
          Go to the loft without
        </LinkButton>
      </div>
    </form>
  );
}
