import NextAuth, { CredentialsSignin } from 'next-auth';
import Credentials from 'next-auth/providers/credentials';
import { credentialsSchema } from '@/lib/schemas/credentials';
import { env } from '@/lib/server/env';
import { closeSession, openSession, SESSION_DAYS } from '@/lib/server/sessions';
import { redirectTarget } from './redirect-target';

declare module 'next-auth' {
  interface Session {
    sessionId?: string;
  }
}

declare module '@auth/core/jwt' {
  interface JWT {
    /** id of the row in the table session: all that the cookie carries */
    sessionId?: string;
  }
}

/** Carries the refusal's code out of next-auth. */
class SignInRefused extends CredentialsSignin {
  constructor(code: string) {
    super();
    this.code = code;
  }
}

const credentials = Credentials({
  credentials: { email: { type: 'email' }, password: { type: 'password' } },
  async authorize(input) {
    const parsed = credentialsSchema.safeParse(input);
    if (!parsed.success) throw new SignInRefused('invalid');
    const answer = await openSession(parsed.data.email, parsed.data.password);
    if (!answer.ok) throw new SignInRefused(answer.code);
    return { id: answer.sessionId };
  },
});

/** The only file that speaks to next-auth; the rest of the application asks `lib/server/current-account`. */
export const { handlers, auth, signIn, signOut } = NextAuth(() => ({
  secret: env().AUTH_SECRET,
  trustHost: true,
  session: { strategy: 'jwt', maxAge: SESSION_DAYS * 86_400 },
  pages: { signIn: '/sign-in', error: '/sign-in' },
  providers: [credentials],
  callbacks: {
    jwt({ token, user }) {
      const sessionId = (user as { id?: string } | undefined)?.id ?? token.sessionId;
      return sessionId ? { sessionId } : null;
    },
    session: ({ session, token }) => ({ expires: session.expires, sessionId: token.sessionId }),
    redirect: ({ url, baseUrl }) => redirectTarget(url, baseUrl),
  },
  events: {
    async signOut(message) {
      if ('token' in message && message.token?.sessionId) await closeSession(message.token.sessionId);
    },
  },
  logger: {
    // A wrong password is no fault of the server's, and its stack would fill the log.
    error(error) {
      if (!(error instanceof CredentialsSignin))
        process.stderr.write(`[sign-in] ${error.name}: ${error.message}\n`);
    },
    warn: () => undefined,
    debug: () => undefined,
  },
}));
