'use client';

import Link from 'next/link';
import { useSyncExternalStore } from 'react';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import type { LoggedOperation } from './operation-log';
import type { ReadingLog } from './reading-log';

/**
 * What needs a decision: two texts for one field, or a change that the server does not take. Nothing is merged by itself.
 * `labelOf` names a field of the open sheet.
 */
export function Undecided(props: {
  log: ReadingLog;
  sheetId: string;
  labelOf: (passId: string, pointer: string) => string;
  clock: (at: Date) => string;
}) {
  const { log, sheetId, labelOf, clock } = props;
  const all = useSyncExternalStore(
    log.subscribe,
    () => log.log,
    () => log.log,
  );
  const open = all.filter((entry) => entry.state !== 'waiting');
  const here = open.filter((entry) => entry.sheetId === sheetId);
  const elsewhere = new Map(open.filter((entry) => entry.sheetId !== sheetId).map((entry) => [entry.sheetId, entry]));
  if (open.length === 0) return null;
  return (
    <Notice
      tone="brass"
      title={open.length === 1 ? '1 reading needs a decision' : `${open.length} readings need a decision`}
    >
      <ul className="grid gap-3">
        {here.map((entry) => (
          <li key={entry.operation.opId}>
            {entry.state === 'conflict' ? (
              <Conflict entry={entry} log={log} labelOf={labelOf} clock={clock} />
            ) : (
              <Refused entry={entry} log={log} labelOf={labelOf} />
            )}
          </li>
        ))}
        {[...elsewhere.values()].map((entry) => (
          <li key={entry.sheetId}>
            On another sheet:{' '}
            <Link href={`/jobs/${entry.jobId}/sheets/${entry.sheetId}`} className="underline">
              {entry.sheetTitle}
            </Link>
          </li>
        ))}
      </ul>
    </Notice>
  );
}

interface Part {
  entry: LoggedOperation;
  log: ReadingLog;
  labelOf: (passId: string, pointer: string) => string;
}

function Conflict({ entry, log, labelOf, clock }: Part & { clock: (at: Date) => string }) {
  const { operation, server } = entry;
  if (!server) return null;
  const label = labelOf(operation.passId, operation.cellId);
  return (
    <>
      <p>
        {label}: you typed <Figure text={operation.text} /> at {clock(new Date(operation.deviceTime))}, the server holds{' '}
        <Figure text={server.text} /> {server.by ? `of ${server.by}` : ''} from {clock(new Date(server.at))}.
      </p>
      <div className="mt-1 flex flex-wrap gap-2">
        <Button onClick={() => log.decide(operation.opId, 'own')}>Keep {show(operation.text)}, mine</Button>
        <Button onClick={() => log.decide(operation.opId, 'server')}>Keep {show(server.text)} of the server</Button>
      </div>
    </>
  );
}

function Refused({ entry, log, labelOf }: Part) {
  const { operation, problem } = entry;
  return (
    <>
      <p>
        {labelOf(operation.passId, operation.cellId)}: <Figure text={operation.text} /> was not taken. {problem}
      </p>
      <div className="mt-1">
        <Button onClick={() => log.putAside(operation.opId)}>I have seen it, put it aside</Button>
      </div>
    </>
  );
}

const show = (text: string) => (text.trim() === '' ? 'empty' : text);
const Figure = ({ text }: { text: string }) => <span className="font-mono font-medium">{show(text)}</span>;
