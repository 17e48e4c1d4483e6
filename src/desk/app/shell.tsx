import { Link, Outlet, ScrollRestoration } from 'react-router-dom';
import { Wordmark } from '#src/ui/wordmark.tsx';
import { AccountBar } from './account-bar.tsx';
import { SiteGroups, SitePlaces } from './site-navigation.tsx';

/** The frame of every page at the desk: wordmark, navigation, who is signed in, and the page itself. */
export const Shell = () => (
  <div className="mx-auto max-w-[1520px] px-4 sm:px-10">
    <a
      href="#page"
      className="sr-only rounded-xl bg-ink px-5 py-3 font-black text-ground focus:not-sr-only focus:absolute focus:top-3 focus:left-3 focus:z-30"
    >
      Skip to the page
    </a>
    <header className="screen-only grid gap-2 pt-5 pb-10">
      <div className="flex flex-wrap items-center gap-x-7 gap-y-2">
        <Link to="/" className="rounded-lg" aria-label="Ladlemark, today">
          <Wordmark />
        </Link>
        <div className="order-3 w-full lg:order-none lg:w-auto">
          <SiteGroups />
        </div>
        <div className="ml-auto">
          <AccountBar />
        </div>
      </div>
      <SitePlaces />
    </header>
    <main id="page" tabIndex={-1} className="pb-24 outline-none">
      <Outlet />
    </main>
    <ScrollRestoration getKey={({ pathname }) => pathname} />
  </div>
);
