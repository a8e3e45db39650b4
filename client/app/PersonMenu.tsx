import { useEffect, useRef, useState } from 'react';
import { useNavigate } from 'react-router-dom';

import type { Role } from '#shared/contracts/session';

import { useSignOut } from '../data/mutations.ts';
import { useSession } from '../data/queries.ts';
import { sentenceOf } from './errorSentences.ts';
import { paths } from './paths.ts';

const roleNames: Readonly<Record<Role, string>> = {
  admin: 'Admin',
  engineer: 'Engineer',
  checker: 'Checker',
  drafter: 'Drafter',
};

/** Who works here, in what role, and the way out. */
export function PersonMenu() {
  const session = useSession();
  const signOut = useSignOut();
  const navigate = useNavigate();
  const [open, setOpen] = useState(false);
  const box = useRef<HTMLDivElement>(null);
  const button = useRef<HTMLButtonElement>(null);

  useEffect(() => {
    if (!open) return undefined;
    const outside = (event: PointerEvent) => {
      if (event.target instanceof Node && box.current?.contains(event.target) !== true) setOpen(false);
    };
    document.addEventListener('pointerdown', outside);
    return () => document.removeEventListener('pointerdown', outside);
  }, [open]);

  if (session.data === undefined) return null;
  const { person, office } = session.data;
  return (
    <div
      ref={box}
      className="relative flex"
      onKeyDown={(event) => {
        if (event.key === 'Escape' && open) {
          setOpen(false);
          button.current?.focus();
        }
      }}
    >
      <button
        ref={button}
        type="button"
        className="gw-cell cursor-pointer"
        aria-expanded={open}
        onClick={() => setOpen(!open)}
      >
        <b>{roleNames[person.role]}</b>
        <span>{person.name}</span>
      </button>
      {open ? (
        <div className="gw-menu">
          <p className="note border-b border-rule px-4 py-3">
            {person.email}
            <br />
            {office.name}
          </p>
          <button
            type="button"
            className="w-full cursor-pointer px-4 py-3 text-left font-medium hover:bg-well"
            disabled={signOut.isPending}
            onClick={() =>
              signOut.mutate(undefined, { onSuccess: () => void navigate(paths.signIn, { replace: true }) })
            }
          >
            Sign out
          </button>
          {signOut.error === null ? null : (
            <p className="note gw-problem mx-4 mb-3" role="alert">
              {sentenceOf(signOut.error)}
            </p>
          )}
        </div>
      ) : null}
    </div>
  );
}
