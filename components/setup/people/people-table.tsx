import { Button } from '@/components/ui/button';
import { Table } from '@/components/ui/table';
import { Tag } from '@/components/ui/tag';
import { roleNames, type Role } from '@/lib/permissions';

export interface ListedPerson {
  id: number;
  name: string;
  email: string;
  role: Role;
  isDisabled: boolean;
}

export type PeopleTableProps = Readonly<{
  people: readonly ListedPerson[];
  ownId: number;
  onChange: (id: number) => void;
}>;

export function PeopleTable({ people, ownId, onChange }: PeopleTableProps) {
  return (
    <Table
      caption="People and their roles"
      rows={people}
      rowKey={(person) => person.id}
      rowClassName={(person) => (person.isDisabled ? 'text-soft' : undefined)}
      columns={[
        {
          key: 'name',
          head: 'Name',
          isRowHead: true,
          className: 'min-w-36',
          cell: (person) => (
            <>
              {person.name}
              {person.id === ownId ? <span className="font-normal text-soft"> (you)</span> : null}
            </>
          ),
        },
        { key: 'role', head: 'Role', cell: (person) => roleNames[person.role], className: 'whitespace-nowrap' },
        { key: 'email', head: 'E-mail', cell: (person) => person.email },
        {
          key: 'state',
          head: 'May sign in',
          className: 'whitespace-nowrap',
          cell: (person) => (person.isDisabled ? <Tag tone="frozen">disabled</Tag> : 'yes'),
        },
        {
          key: 'change',
          head: <span className="sr-only">Change</span>,
          className: 'text-right print:hidden',
          cell: (person) => (
            <Button size="row" variant="quiet" onClick={() => onChange(person.id)} aria-label={`Change ${person.name}`}>
              Change
            </Button>
          ),
        },
      ]}
    />
  );
}
