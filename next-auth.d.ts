import 'next-auth';
import 'next-auth/jwt';

declare module 'next-auth' {
  interface User {
    sessionVersion: number;
  }
  interface Session {
    personId: number;
    sessionVersion: number;
  }
}

declare module 'next-auth/jwt' {
  interface JWT {
    personId: number;
    sessionVersion: number;
  }
}
