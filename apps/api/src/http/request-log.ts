import type { RequestHandler } from 'express';
import { pinoHttp } from 'pino-http';
import type { Context } from '../context.ts';

/** Logs what changes something or goes wrong; reading only where all is asked for. */
export function requestLog({ log: logger }: Pick<Context, 'log'>): RequestHandler {
  return pinoHttp({
    logger,
    serializers: { req: withoutTokens, res: onlyStatus },
    customLogLevel: ({ method }, { statusCode }, error) => {
      if (error || statusCode >= 500) return 'error';
      if (statusCode >= 400) return 'warn';
      return method === 'GET' || method === 'HEAD' ? 'debug' : 'info';
    },
  });
}

function onlyStatus(response: { statusCode: number }) {
  return { statusCode: response.statusCode };
}

/** A customer's token never reaches the log. */
function withoutTokens(request: { id: unknown; method: string; url: string }) {
  const url = request.url.replace(/\/(c|links)\/[^/?#]+/, '/$1/…');
  return { id: request.id, method: request.method, url };
}
