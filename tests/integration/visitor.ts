/** Who asks: the session id that the cookie would carry. */
export const visitor: { sessionId: string | undefined } = { sessionId: undefined };

/** Takes the place of `lib/auth/session-id`; everything behind the cookie, sessions included, is the real thing. */
export function sessionId(): Promise<string | undefined> {
  return Promise.resolve(visitor.sessionId);
}
