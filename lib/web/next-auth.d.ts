import 'next-auth';
import 'next-auth/jwt';

declare module 'next-auth' {
  interface User {
    id: string;
    email: string;
    name: string;
    sessionVersion: number;
  }
  interface Session {
    user: { id: string; email: string; name: string };
  }
}

declare module 'next-auth/jwt' {
  interface JWT {
    sessionVersion?: number;
  }
}
