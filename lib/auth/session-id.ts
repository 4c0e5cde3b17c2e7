import { auth } from './next-auth';

/** The session id in the request's cookie; what it is worth is for the table session to say. */
export async function sessionId(): Promise<string | undefined> {
  return (await auth())?.sessionId;
}
