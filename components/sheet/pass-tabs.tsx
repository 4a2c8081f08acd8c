'use client';

import { Tabs } from '@/components/ui/tabs';
import { verdictText } from '@/lib/reporting/result-text';
import { shownUnit } from '@/lib/sheet/shown-unit';
import { isJudged } from './result-words';
import { useEvaluated } from './sheet-context';
import { passWords, type SheetPass } from './sheet-data';
import type { SheetSession } from './sheet-session';

/** Sets of readings in words, each with what it comes to. */
export function PassTabs(props: {
  session: SheetSession;
  passes: SheetPass[];
  chosen: string;
  onChoose: (passId: string) => void;
  panelId: string;
}) {
  const { session, passes, chosen, onChoose, panelId } = props;
  return (
    <Tabs
      label="Sets of readings"
      panelId={panelId}
      chosen={chosen}
      onChoose={onChoose}
      choices={passes.map((pass) => ({
        key: pass.id,
        label: passWords(pass),
        note: <PassFigure session={session} passId={pass.linkedTo ?? pass.id} linked={pass.linkedTo !== null} />,
      }))}
    />
  );
}

function PassFigure({ session, passId, linked }: { session: SheetSession; passId: string; linked: boolean }) {
  const outcome = useEvaluated(session, passId, (evaluated) => evaluated.outcome);
  if (linked) return <span className="text-sm">= as found</span>;
  if (!isJudged(outcome)) return null;
  const { verdict } = outcome.judgement;
  const unit = shownUnit(outcome.displayed);
  const ink = verdict === 'out-of-tolerance' ? 'text-oxide' : verdict === 'undecided' ? 'text-brass' : 'text-blue';
  return (
    <>
      {unit === 'items' ? (
        <span className={`text-sm font-medium ${ink}`}>{verdictText(verdict, unit)}</span>
      ) : (
        <>
          <span className={`font-mono font-medium ${ink}`}>{outcome.displayed.textMm.replace('-', '−')}</span>
          <span className="sr-only">, {verdictText(verdict, unit)}</span>
        </>
      )}
    </>
  );
}
