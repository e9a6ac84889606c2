import { type Role } from '@/lib/permissions';
import { type Person } from './browser';

const demo = (localPart: string): Person => ({ email: `${localPart}@skerrow.example`, password: 'skerrow-demo' });

/** One of the demo's people for each role. */
export const personOf: Readonly<Record<Role, Person>> = {
  dispatcher: demo('dispatcher'),
  driver: demo('driver'),
  supervisor: demo('supervisor'),
  yard: demo('yard'),
  administrator: demo('administrator'),
  observer: demo('observer'),
};
