'use client';

import { useState } from 'react';
import { AddPersonForm } from '@/components/setup/people/add-person-form';
import { PeopleTable, type ListedPerson } from '@/components/setup/people/people-table';
import { PersonForm } from '@/components/setup/people/person-form';
import { useAnnounce } from '@/components/ui/announcements';
import { Button } from '@/components/ui/button';
import { Sheet } from '@/components/ui/dialog';
import { PageBody, PageHeader } from '@/components/ui/page-header';
import { useSubmission } from '@/components/ui/use-submission';
import { BackToSetup } from '../back';
import { addPersonAction, changePersonAction, disablePersonAction, setPersonPasswordAction } from './actions';

export type PeopleScreenProps = Readonly<{ people: readonly ListedPerson[]; ownId: number }>;

function ChangePerson({
  person,
  ownId,
  onDone,
}: Readonly<{ person: ListedPerson; ownId: number; onDone: (said: string) => void }>) {
  const change = useSubmission(changePersonAction, () => onDone('Saved.'));
  const password = useSubmission(setPersonPasswordAction, () =>
    onDone(`New password set. ${person.name} is signed out everywhere.`),
  );
  const disable = useSubmission(disablePersonAction, () =>
    onDone(
      person.isDisabled ? `${person.name} may sign in again.` : `${person.name} is signed out and may not sign in.`,
    ),
  );
  return <PersonForm person={person} ownId={ownId} change={change} password={password} disable={disable} />;
}

export function PeopleScreen({ people, ownId }: PeopleScreenProps) {
  const [chosenId, setChosenId] = useState<number | 'new' | null>(null);
  const announce = useAnnounce();
  const done = (said: string) => {
    setChosenId(null);
    announce(said);
  };
  const add = useSubmission(addPersonAction, () => done('Added. Hand the password over in person.'));
  const chosen = people.find((person) => person.id === chosenId);
  const active = people.filter((person) => !person.isDisabled).length;
  return (
    <>
      <PageHeader
        back={<BackToSetup />}
        title="People"
        facts={[`${active} may sign in${people.length > active ? `, ${people.length - active} disabled` : ''}`]}
        actions={
          <Button variant="primary" onClick={() => setChosenId('new')}>
            Add a person
          </Button>
        }
      />
      <PageBody>
        <PeopleTable people={people} ownId={ownId} onChange={setChosenId} />
      </PageBody>
      <Sheet
        isOpen={chosenId !== null}
        onOpenChange={(isOpen) => setChosenId(isOpen ? chosenId : null)}
        title={chosen?.name ?? 'Add a person'}
        description={chosen ? chosen.email : 'They sign in with their e-mail address and the password you give them.'}
      >
        {chosenId === 'new' ? <AddPersonForm submission={add} /> : null}
        {chosen ? <ChangePerson key={chosen.id} person={chosen} ownId={ownId} onDone={done} /> : null}
      </Sheet>
    </>
  );
}
