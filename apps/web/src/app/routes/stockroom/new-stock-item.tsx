import type { ReactNode } from 'react';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { Card } from '../../../components/card.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { say } from '../../../components/toast.ts';
import { suppliersQuery } from '../../../features/suppliers/suppliers.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { choicesOf } from './choices.ts';

export async function loadSuppliers() {
  await queryClient.ensureQueryData(suppliersQuery());
  return null;
}

interface Added {
  id: number;
  name: string;
}

interface NewStockItemProps {
  title: string;
  /** Where its own page lies, without its id. */
  room: string;
  children: (suppliers: ReturnType<typeof choicesOf>, onAdded: (added: Added) => void) => ReactNode;
}

/** The page on which a leather or a hardware is added; goes to its own page afterwards. */
export function NewStockItem({ title, room, children }: NewStockItemProps) {
  const navigate = useNavigate();
  const { data: suppliers } = useSuspenseQuery(suppliersQuery());
  const goTo = ({ id, name }: Added) => {
    say(`${name} is added.`);
    void navigate(`${room}/${id}`);
  };
  return (
    <>
      <PageHeader title={title} />
      <Card>{children(choicesOf(suppliers.items), goTo)}</Card>
    </>
  );
}
