import { Link } from 'react-router-dom';
import { buttonClass } from '#src/ui/button-class.ts';
import { PageTitle } from '#src/ui/page-title.tsx';

/** What an address shows that leads nowhere. */
export const NotFoundPage = () => (
  <>
    <PageTitle
      title="There is no page here"
      summary="The address may be mistyped, or what it named is no longer there."
    />
    <p className="flex flex-wrap gap-3">
      <Link to="/" className={buttonClass({ kind: 'main' })}>
        Go to today
      </Link>
      <Link to="/melts" className={buttonClass()}>
        Open the melt book
      </Link>
    </p>
  </>
);
