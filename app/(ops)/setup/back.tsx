import { type Route } from 'next';
import Link from 'next/link';

export function BackToSetup() {
  return (
    <Link href={'/setup' as Route} className="link">
      Set-up
    </Link>
  );
}
