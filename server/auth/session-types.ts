import type { Actor } from '#shared/permissions/ability.ts';

declare module 'express-session' {
  interface SessionData {
    csrfToken: string;
    /** milliseconds since 1970, for the absolute end of the session */
    signedInAt: number;
  }
}

declare global {
  // The names are those that Passport's own types are merged with.
  // oxlint-disable-next-line typescript/no-namespace
  namespace Express {
    // oxlint-disable-next-line typescript/no-empty-object-type, typescript/no-empty-interface
    interface User extends Actor {}
  }
}
