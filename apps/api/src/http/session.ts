import session from 'express-session';
import passport from 'passport';
import { Strategy } from 'passport-local';
import type { Request, RequestHandler, Response } from 'express';
import type { Context } from '../context.ts';
import { Person } from '../modules/people/person.entity.ts';
import { checkPassword } from '../modules/people/passwords.ts';
import { sessionSecret } from './session-secret.ts';
import { SessionStore } from './session-store.ts';

/** What passport puts on a request: the person as the database has them now, not as they were at sign-in. */
declare global {
  namespace Express {
    interface User {
      id: number;
      name: string;
      email: string;
      role: 'owner' | 'maker' | 'bookkeeper';
    }
  }
}

type DoneReading = (error: unknown, person: Express.User | false) => void;

/** Checks the e-mail address and password that a request brings. */
export type Authenticate = (request: Request) => Promise<Express.User | undefined>;

/** Sessions by cookie, kept in the database, and the person behind each. */
export async function sessions(
  context: Context,
): Promise<{ middleware: RequestHandler[]; authenticate: Authenticate }> {
  const secure =
    context.config.tls !== undefined || context.config.publicUrl?.startsWith('https:') === true;
  const keeper = session({
    name: secure ? '__Host-hidewright' : 'hidewright',
    secret: await sessionSecret(context.config.dataDir),
    store: new SessionStore(context.orm, context.clock),
    resave: false,
    saveUninitialized: false,
    proxy: secure,
    cookie: { httpOnly: true, sameSite: 'lax', secure, path: '/' },
  });
  const authenticator = passportFor(context);
  return {
    middleware: [
      keeper,
      authenticator.initialize() as RequestHandler,
      authenticator.session() as RequestHandler,
    ],
    authenticate: (request) => byPassword(authenticator, request),
  };
}

function byPassword(
  authenticator: passport.Authenticator,
  request: Request,
): Promise<Express.User | undefined> {
  return new Promise((resolve, reject) => {
    const answer = (error: unknown, person: Express.User | false | undefined) => {
      if (error) reject(error instanceof Error ? error : new Error(String(error)));
      else resolve(person === false ? undefined : person);
    };
    const middleware = authenticator.authenticate('local', answer) as RequestHandler;
    void middleware(request, request.res as Response, reject);
  });
}

/** One authenticator for each context, since tests run several in one process. */
function passportFor(context: Context): passport.Authenticator {
  const authenticator = new passport.Passport();
  authenticator.use(
    new Strategy({ usernameField: 'email' }, (email, password, done) => {
      findByPassword(context, email, password).then(
        (person) => {
          done(null, person ?? false);
        },
        (error: unknown) => {
          done(error);
        },
      );
    }),
  );
  authenticator.serializeUser((person, done) => {
    done(null, person.id);
  });
  authenticator.deserializeUser((request: Request, id: number, done: DoneReading) => {
    const { person } = request.session;
    done(null, person?.id === id ? person : false);
  });
  return authenticator as passport.Authenticator;
}

async function findByPassword(
  context: Context,
  email: string,
  password: string,
): Promise<Express.User | undefined> {
  const person = await context.orm.em
    .fork()
    .findOne(Person, { email: email.trim().toLowerCase(), active: true });
  const matches = await checkPassword(person?.passwordHash, password);
  return person !== null && matches ? person : undefined;
}
