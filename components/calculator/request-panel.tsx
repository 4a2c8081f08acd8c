'use client';

import { useId, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';

const path = '/api/evaluations';

interface Answer {
  status: number;
  text: string;
}

/** The same calculation as a request: the text follows the form until somebody changes it by hand. */
export function RequestPanel({ input }: { input: object | null }) {
  const id = useId();
  const [own, setOwn] = useState<string | null>(null);
  const [answer, setAnswer] = useState<Answer | null>(null);
  const [busy, setBusy] = useState(false);
  const [said, setSaid] = useState('');
  const text = own ?? (input ? JSON.stringify(input, null, 2) : '');

  const send = async () => {
    setBusy(true);
    setAnswer(null);
    try {
      const response = await fetch(path, {
        method: 'POST',
        headers: { 'content-type': 'application/json', accept: 'application/json, application/problem+json' },
        body: text,
      });
      setAnswer({ status: response.status, text: pretty(await response.text()) });
    } catch {
      setAnswer({ status: 0, text: 'The server did not answer. Nothing is lost; try again when the network is back.' });
    }
    setBusy(false);
  };
  const copy = async () => {
    try {
      await navigator.clipboard.writeText(text);
      setSaid('Copied.');
    } catch {
      setSaid('This browser does not let a page copy. Mark the text and copy it yourself.');
    }
  };

  return (
    <details className="mt-4 border-y border-line">
      <summary className="flex min-h-12 cursor-pointer items-center font-semibold">
        <span aria-hidden="true" className="mr-2">
          ▸
        </span>
        As a request
      </summary>
      <div className="grid gap-3 pb-4">
        <p className="text-ink2">
          The server computes the same: <span className="font-mono">POST {path}</span>, without an account. Figures are
          texts, so that no digit is lost.
        </p>
        <label htmlFor={id} className="font-medium">
          Request
        </label>
        <textarea
          id={id}
          rows={Math.min(Math.max(text.split('\n').length, 6), 22)}
          value={text}
          spellCheck={false}
          onChange={(event) => setOwn(event.target.value)}
          className="w-full rounded border-[1.5px] border-ink2 bg-leaf px-3 py-2.5 font-mono text-sm focus:border-blue"
        />
        <div className="flex flex-wrap gap-2">
          <Button onClick={send} disabled={busy || text.trim() === ''}>
            {busy ? 'Sending' : 'Send it to the server'}
          </Button>
          <Button onClick={copy} disabled={text === ''}>
            Copy the request
          </Button>
          {own !== null && <Button onClick={() => setOwn(null)}>Take it from the form again</Button>}
        </div>
        <p role="status" className="text-sm text-ink2">
          {said}
        </p>
        {answer && (
          <Notice
            tone={answer.status === 200 ? 'blue' : 'oxide'}
            title={answer.status === 0 ? 'No answer' : `Answer, status ${answer.status}`}
            live
          >
            {/* biome-ignore lint/a11y/noNoninteractiveTabindex: a region that scrolls must be reachable by keyboard */}
            <pre tabIndex={0} className="max-h-96 overflow-auto font-mono text-sm">
              {answer.text}
            </pre>
          </Notice>
        )}
      </div>
    </details>
  );
}

function pretty(text: string): string {
  try {
    return JSON.stringify(JSON.parse(text), null, 2);
  } catch {
    return text;
  }
}
