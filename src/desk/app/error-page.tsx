import { isRouteErrorResponse, Link, useRouteError } from 'react-router-dom';
import { sentenceOf } from '#src/lib/http.ts';
import { Button } from '#src/ui/button.tsx';
import { buttonClass } from '#src/ui/button-class.ts';
import { NotFoundPage } from './not-found-page.tsx';

// Browsers word it differently when a part of the application is no longer where it was.
const isMissingPart = (error: unknown): boolean =>
  error instanceof TypeError && /module|import/i.test(error.message);

const sentence = (error: unknown): string =>
  isMissingPart(error)
    ? 'A part of the desk could not be loaded. The server may be away, or was renewed since this page was opened: load it again.'
    : sentenceOf(error);

/** What stands in place of a page that broke: what to do, and a way out. Records at the server are untouched. */
export const ErrorPage = () => {
  const error = useRouteError();
  if (isRouteErrorResponse(error) && error.status === 404) return <NotFoundPage />;
  return (
    <div role="alert" className="grid max-w-2xl gap-5 py-10">
      <title>Something went wrong · Ladlemark</title>
      <h1 className="text-[34px] leading-tight font-black tracking-tight">This page stopped working</h1>
      <p className="text-[19px] text-soft">
        {sentence(error)} What was stored before stays stored; what was typed here and not yet stored must be
        typed again.
      </p>
      <p className="flex flex-wrap gap-3">
        <Button kind="main" onClick={() => window.location.reload()}>
          Load it again
        </Button>
        <Link to="/" className={buttonClass()}>
          Go to today
        </Link>
      </p>
    </div>
  );
};
