import { useQuery } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { bitsQuery } from '../../api/bits.ts';
import { machinesQuery } from '../../api/machines.ts';
import { stockQuery } from '../../api/stock.ts';
import { EmptyState } from '../../components/EmptyState.tsx';
import { LinkButton } from '../../components/LinkButton.tsx';
import { PageTitle } from '../../components/PageTitle.tsx';
import type { OpenForm } from './bench-address.ts';
import { BitForm } from './bit/BitForm.tsx';
import { MachineForm } from './machine/MachineForm.tsx';
import { StockForm } from './stock/StockForm.tsx';

const newTitles = { machine: 'Add a machine', bit: 'Add a bit', stock: 'Add stock' } as const;

/** The form that the address names, in place of the lists. */
export function OpenBenchForm({ thing, id }: OpenForm) {
  const navigate = useNavigate();
  const machine = useQuery(machinesQuery).data?.items.find((item) => item.id === id) ?? null;
  const bit = useQuery(bitsQuery).data?.items.find((item) => item.id === id) ?? null;
  const stock = useQuery(stockQuery).data?.items.find((item) => item.id === id) ?? null;
  const found = { machine, bit, stock }[thing];
  const back = () => void navigate('/bench');
  if (id !== null && found === null) {
    return (
      <>
        <PageTitle>Not on the bench</PageTitle>
        <EmptyState
          title="This is no longer on your bench"
          action={<LinkButton to="/bench">Open the bench</LinkButton>}
        >
          It was removed, perhaps in another window.
        </EmptyState>
      </>
    );
  }
  return (
    <div className={`space-y-6 ${thing === 'machine' ? 'max-w-7xl' : 'max-w-4xl'}`}>
      <PageTitle>{found === null ? newTitles[thing] : `Change ${found.name}`}</PageTitle>
      {thing === 'machine' && <MachineForm machine={machine} onSaved={back} onCancel={back} />}
      {thing === 'bit' && <BitForm bit={bit} onSaved={back} onCancel={back} />}
      {thing === 'stock' && <StockForm stock={stock} onSaved={back} onCancel={back} />}
    </div>
  );
}
