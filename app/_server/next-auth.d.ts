import 'next-auth';

declare module 'next-auth' {
  interface Session {
    user: { id: string };
    /** Milliseconds since 1970. */
    signedInAt: number;
  }
}

declare module 'next-auth/jwt' {
  interface JWT {
    signedInAt?: number;
  }
}
