import { Router } from 'express';
import { openShop, readSession, signIn, signOut } from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { openNewShop } from '../../flows/open-new-shop.ts';
import { readAsked } from '../../http/asked.ts';
import { Problem } from '../../http/problem.ts';
import { bind, sendReply } from '../../http/serve.ts';
import type { Authenticate } from '../../http/session.ts';
import { inTransaction, theProgram } from '../../work.ts';
import { hashPassword } from '../people/passwords.ts';
import { describeSession as describe } from './describe-session.ts';
import { endSession, startSession } from './session-life.ts';
import { signInLimits } from './sign-in-limits.ts';

export function sessionRoutes(context: Context, authenticate: Authenticate): Router {
  const router = Router();
  router.post('/session', ...signInLimits(context));

  bind(router, readSession, async (request, response) => {
    sendReply(readSession, response, await describe(context, request.user), request.user?.role);
  });

  bind(router, signIn, async (request, response) => {
    readAsked(signIn, request);
    const person = await authenticate(request);
    if (person === undefined) {
      throw new Problem(
        401,
        'Not signed in',
        'That e-mail address and password do not go together. Check both and try again.',
      );
    }
    await startSession(request, person);
    sendReply(signIn, response, await describe(context, person), person.role);
  });

  bind(router, signOut, async (request, response) => {
    await endSession(request);
    response.clearCookie('hidewright');
    sendReply(signOut, response, await describe(context, undefined), undefined);
  });

  bind(router, openShop, async (request, response) => {
    const { body } = readAsked(openShop, request);
    const passwordHash = await hashPassword(body.password);
    const owner = await inTransaction(context, theProgram, (work) =>
      openNewShop(work, { ...body, passwordHash }),
    );
    await startSession(request, owner);
    sendReply(openShop, response, await describe(context, owner), owner.role);
  });

  return router;
}
