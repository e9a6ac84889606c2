import { type Metadata } from 'next';
import { roleNames } from '@/lib/permissions';
import { requirePage } from '@/lib/server/page';
import { AccountScreen } from './account-screen';

export const metadata: Metadata = { title: 'Your account' };

export default async function AccountPage() {
  const { name, email, role, unitSystem, theme } = await requirePage('account.edit');
  return <AccountScreen name={name} email={email} roleName={roleNames[role]} units={unitSystem} theme={theme} />;
}
