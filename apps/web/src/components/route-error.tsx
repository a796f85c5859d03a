import { isRouteErrorResponse, useNavigate, useRouteError } from 'react-router-dom';
import { ApiProblem } from '../lib/api-problem.ts';
import { Button } from './button.tsx';
import { LinkButton } from './link-button.tsx';
import { PageTitle } from './page-title.tsx';

interface Words {
  title: string;
  sentence: string;
  mayPass: boolean;
  reference?: string | undefined;
}

const titles: Record<number, string> = {
  401: 'Please sign in again',
  403: 'This is not open to you',
  404: 'Not found',
};

function wordsFor(error: unknown): Words {
  if (error instanceof ApiProblem) {
    const title = titles[error.status] ?? error.title;
    return { title, sentence: error.detail, mayPass: error.isPassing, reference: error.requestId };
  }
  if (isRouteErrorResponse(error)) {
    const sentence =
      typeof error.data === 'string' && error.data !== '' ? error.data : error.statusText;
    return { title: titles[error.status] ?? 'That did not work', sentence, mayPass: false };
  }
  return {
    title: 'This page did not work',
    sentence:
      'Nothing you saved is lost. Try again; if it happens twice, tell whoever looks after the program.',
    mayPass: true,
  };
}

/** What to say and what to do when a place cannot be shown. */
export function RouteError() {
  const { title, sentence, mayPass, reference } = wordsFor(useRouteError());
  const navigate = useNavigate();
  return (
    <div className="max-w-prose">
      <PageTitle>{title}</PageTitle>
      <h1 tabIndex={-1}>{title}</h1>
      <p className="mt-2">{sentence}</p>
      {reference && <p className="mt-1 text-sm text-ink-soft">Reference {reference}</p>}
      <div className="mt-5 flex flex-wrap gap-2">
        {mayPass && (
          <Button tone="primary" onClick={() => void navigate(0)}>
            Try again
          </Button>
        )}
        <LinkButton to="/today">Go to Today</LinkButton>
      </div>
    </div>
  );
}
