'use client';

import { type FormEvent, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Checkbox, TextInput } from '@/components/ui/inputs';
import { Notice } from '@/components/ui/notice';
import { ApiProblem } from '@/lib/http/api-client';
import { signIn } from '@/lib/http/sign-in-client';

interface DemoAccount {
  email: string;
  who: string;
}

const wrong =
  'E-mail address and password do not belong together, or the account may not sign in at the moment. Look at both once more; an administrator can help.';

/** A plain form; in demo mode a press on an account fills it in. */
export function SignInForm({ demo }: { demo: { accounts: readonly DemoAccount[]; password: string } | null }) {
  const [email, setEmail] = useState('');
  const [password, setPassword] = useState('');
  const [shown, setShown] = useState(false);
  const [busy, setBusy] = useState(false);
  const [refusal, setRefusal] = useState<{ title: string; detail: string } | null>(null);

  const submit = async (event: FormEvent) => {
    event.preventDefault();
    if (busy) return;
    setBusy(true);
    setRefusal(null);
    try {
      const outcome = await signIn(email, password);
      // A full load: every page is drawn for the person who is signed in now.
      if (outcome.ok) return window.location.assign('/');
      setRefusal(
        outcome.reason === 'wait'
          ? { title: 'Too many attempts', detail: `Please wait ${outcome.waitSeconds} seconds, then try again.` }
          : { title: 'Not signed in', detail: wrong },
      );
    } catch (error) {
      if (!(error instanceof ApiProblem)) throw error;
      setRefusal(error);
    }
    setBusy(false);
  };

  return (
    <div className="grid gap-8">
      <form method="post" onSubmit={submit} className="grid max-w-md gap-4">
        <Field label="E-mail address">
          <TextInput
            name="email"
            type="email"
            autoComplete="username"
            required
            value={email}
            onChange={(event) => setEmail(event.target.value)}
          />
        </Field>
        <Field label="Password">
          <TextInput
            name="password"
            type={shown ? 'text' : 'password'}
            autoComplete="current-password"
            required
            value={password}
            onChange={(event) => setPassword(event.target.value)}
          />
        </Field>
        <Checkbox label="Show the password" checked={shown} onChange={(event) => setShown(event.target.checked)} />
        {refusal && (
          <Notice tone="oxide" title={refusal.title} live>
            {refusal.detail}
          </Notice>
        )}
        <Button type="submit" variant="strong" disabled={busy}>
          {busy ? 'Signing in' : 'Sign in'}
        </Button>
      </form>
      {demo && (
        <DemoAccounts
          {...demo}
          onChoose={(account) => {
            setEmail(account.email);
            setPassword(demo.password);
          }}
        />
      )}
    </div>
  );
}

function DemoAccounts(props: {
  accounts: readonly DemoAccount[];
  password: string;
  onChoose: (account: DemoAccount) => void;
}) {
  return (
    <section aria-labelledby="demo" className="border-[1.5px] border-brass bg-brass-wash p-4">
      <h2 id="demo" className="font-semibold">
        This is a demonstration with invented companies
      </h2>
      <p className="mt-1">
        Password of every account: <span className="font-mono">{props.password}</span>. A press on an account fills it
        in.
      </p>
      <ul className="mt-2 divide-y divide-line">
        {props.accounts.map((account) => (
          <li key={account.email}>
            <button
              type="button"
              className="flex min-h-12 w-full flex-wrap items-center justify-between gap-x-4 text-left"
              onClick={() => props.onChoose(account)}
            >
              <span className="font-mono text-[15px] underline underline-offset-3">{account.email}</span>
              <span className="text-sm">{account.who}</span>
            </button>
          </li>
        ))}
      </ul>
    </section>
  );
}
