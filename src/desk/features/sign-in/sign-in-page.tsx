import { Wordmark } from '#src/ui/wordmark.tsx';
import { HangingDrops } from './hanging-drops.tsx';
import { SignInForm } from './sign-in-form.tsx';

/** The door of the desk. */
export const SignInPage = ({ studioName }: { readonly studioName: string }) => (
  <div className="mx-auto grid min-h-dvh max-w-[1180px] content-center gap-x-24 gap-y-12 px-5 py-12 sm:px-10 lg:grid-cols-[1fr_400px]">
    <title>Sign in · Ladlemark</title>
    <header className="grid content-center gap-5">
      <Wordmark size="terminal" />
      <p className="max-w-[22ch] text-[44px] leading-[1.08] font-black tracking-tight text-balance">
        Good to see you. What pours today?
      </p>
      <p className="max-w-[46ch] text-[18px] text-soft">
        This is the desk of {studioName}: the day’s castings, the melt book, the alloys and the people.
      </p>
      <div className="hidden pt-8 lg:block">
        <HangingDrops />
      </div>
    </header>
    <main className="grid content-center gap-6">
      <h1 className="text-[26px] font-black">Sign in at the desk</h1>
      <SignInForm />
      <p className="border-t-2 border-line pt-5 text-soft">
        Standing at the furnace?{' '}
        <a
          href="/kiosk"
          className="rounded-md font-extrabold text-ink underline decoration-2 underline-offset-4"
        >
          The terminal is at /kiosk
        </a>
        ; there you choose your name and type your PIN.
      </p>
    </main>
  </div>
);
