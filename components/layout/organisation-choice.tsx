'use client';

import { useState } from 'react';
import { chooseOrganisation } from '@/lib/http/sign-in-client';

/** For an account that is a member of several organisations. */
export function OrganisationChoice({ organisations }: { organisations: { id: string; name: string }[] }) {
  const [failed, setFailed] = useState(false);
  const choose = async (id: string) => {
    try {
      await chooseOrganisation(id);
      window.location.assign('/');
    } catch {
      setFailed(true);
    }
  };
  return (
    <div>
      <p className="text-sm text-ink2">Work for another organisation</p>
      <ul>
        {organisations.map(({ id, name }) => (
          <li key={id}>
            <button type="button" className="min-h-10 text-left text-blue underline" onClick={() => choose(id)}>
              {name}
            </button>
          </li>
        ))}
      </ul>
      {failed && (
        <p role="alert" className="text-sm text-oxide">
          That did not work. Try again.
        </p>
      )}
    </div>
  );
}
