import 'next-auth';
import 'next-auth/jwt';

declare module 'next-auth' {
  interface User {
    id: string;
    /** The secret of the session that signing in opened. */
    sid: string;
  }
}

declare module 'next-auth/jwt' {
  interface JWT {
    sid?: string;
  }
}
