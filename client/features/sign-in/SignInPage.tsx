import { useId, useRef, useState, type SubmitEvent } from 'react';
import { useNavigate, useSearchParams } from 'react-router-dom';

import { sentenceOf } from '../../app/errorSentences.ts';
import { caution } from '../../app/Foot.tsx';
import { paths } from '../../app/paths.ts';
import { usePageTitle } from '../../app/usePageTitle.ts';
import { Button } from '../../components/ui/Button.tsx';
import { Mark } from '../../components/ui/Mark.tsx';
import { useSignIn } from '../../data/mutations.ts';
import { ShearDiagram } from './ShearDiagram.tsx';

/** Addresses of this application only; anything else leads to the list of buildings. */
const wayBack = (to: string | null): string =>
  to !== null && to.startsWith('/') && !to.startsWith('//') && !to.startsWith('/\\') ? to : paths.buildings;

export function SignInPage() {
  usePageTitle('Sign in');
  const [email, setEmail] = useState('');
  const [password, setPassword] = useState('');
  const [missing, setMissing] = useState<string | null>(null);
  const signIn = useSignIn();
  /** a second click of a double click comes before the page has drawn the first */
  const sending = useRef(false);
  const navigate = useNavigate();
  const [parameters] = useSearchParams();
  const problemId = useId();
  const problem = missing ?? (signIn.error === null ? null : sentenceOf(signIn.error));
  const refused = problem !== null;

  const submit = (event: SubmitEvent<HTMLFormElement>) => {
    event.preventDefault();
    if (sending.current) return;
    if (email.trim() === '' || password === '') {
      setMissing(
        email.trim() === '' ? 'Email is blank; enter the address of your account.' : 'Password is blank; enter it.',
      );
      return;
    }
    setMissing(null);
    sending.current = true;
    signIn.mutate(
      { email: email.trim(), password },
      {
        onSuccess: () => void navigate(wayBack(parameters.get('to')), { replace: true }),
        onSettled: () => {
          sending.current = false;
        },
      },
    );
  };

  return (
    <main className="grid min-h-screen grid-cols-1 lg:grid-cols-[minmax(0,1fr)_560px]">
      <div className="hidden items-end justify-center overflow-hidden lg:flex">
        <ShearDiagram />
      </div>
      <form
        className="flex flex-col justify-center border-line bg-sheet px-5 py-6 sm:px-[72px] lg:border-l"
        aria-label="Sign in"
        noValidate
        onSubmit={submit}
      >
        <div className="mb-2 flex items-center gap-4">
          <Mark size={40} />
          <h1 className="text-[32px] leading-[40px] font-semibold tracking-[-0.015em]">Groundward</h1>
        </div>
        <p className="mb-6 text-graphite">From story forces to an issued wall schedule.</p>
        <label className="gw-label">
          Email
          <input
            className="gw-input mt-1"
            type="email"
            autoComplete="username"
            autoFocus
            aria-invalid={refused}
            aria-describedby={refused ? problemId : undefined}
            value={email}
            onChange={(event) => setEmail(event.target.value)}
          />
        </label>
        <label className="gw-label mt-4">
          Password
          <input
            className="gw-input mt-1"
            type="password"
            autoComplete="current-password"
            aria-invalid={refused}
            aria-describedby={refused ? problemId : undefined}
            value={password}
            onChange={(event) => setPassword(event.target.value)}
          />
        </label>
        <div id={problemId} role="alert" className="min-h-[16px] pt-3">
          {problem === null ? null : <p className="gw-problem">{problem}</p>}
        </div>
        <div className="mt-3">
          <Button look="primary" type="submit" className="h-[40px]! px-5!" aria-disabled={signIn.isPending}>
            Sign in
          </Button>
        </div>
        <p className="note mt-[64px] max-w-[52ch] border-t border-rule pt-3">{caution}</p>
      </form>
    </main>
  );
}
