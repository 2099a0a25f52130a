import { fromNodeHeaders } from 'better-auth/node';
import type { Request, Response } from 'express';
import { Failure } from '../http/failure';
import { word } from '../words';
import type { Auth } from './auth';

/** Whoever is signed in. */
export interface Person {
  readonly id: string;
  readonly name: string;
  readonly email: string;
}

/** Reads the session's cookie; a session that was prolonged sends its cookie along. Throws `signedOut`. */
export async function needPerson(auth: Auth, req: Request, res: Response): Promise<Person> {
  const { headers, response } = await auth.api.getSession({
    headers: fromNodeHeaders(req.headers),
    returnHeaders: true,
  });
  if (response === null) throw new Failure('signedOut', word('server.signedOut'));
  for (const cookie of headers.getSetCookie()) res.append('set-cookie', cookie);
  const { id, name, email } = response.user;
  return { id, name, email };
}
