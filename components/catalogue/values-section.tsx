import { DataCell, HeadCell, Row, RowHead, Table, TableHead } from '@/components/ui/table';
import { dayIn } from '@/lib/dates';
import type { CellState, SaidOfCell } from '@/lib/planning/cell-states';
import { AgreeButton } from './agree-button';
import { cellStateWords, saidWords } from './cell-words';
import { ConfirmForm } from './confirm-form';

export interface ValuesViewer {
  accountId: string;
  mayConfirm: boolean;
  mayAgree: boolean;
  timeZone: string;
}

/** Every figure of a test's tolerances: what holds, who looked it up, and the form to say something of it. */
export function ValuesSection(props: {
  address: { code: string; test: string };
  cells: CellState[];
  history: SaidOfCell[];
  viewer: ValuesViewer;
  fourEyes: boolean;
}) {
  const { address, cells, history, viewer, fourEyes } = props;
  if (cells.length === 0) return <p>The test has no tolerance, so there is nothing to confirm.</p>;
  return (
    <>
      <Table caption="What the organisation says of the tolerances">
        <TableHead>
          <HeadCell>Holds for</HeadCell>
          <HeadCell figure>Figure</HeadCell>
          <HeadCell>Unit</HeadCell>
          <HeadCell>Said of it</HeadCell>
        </TableHead>
        <tbody>
          {cells.map((cell) => (
            <Row key={cell.cell}>
              <RowHead className="font-normal">{cell.words}</RowHead>
              <DataCell figure>
                {cell.figure}
                {cell.state === 'replaced' && (
                  <span className="block text-sm text-ink2">
                    catalogue <span className="line-through">{cell.toleranceUm}</span>
                  </span>
                )}
              </DataCell>
              <DataCell>{cell.unit}</DataCell>
              <DataCell>
                <Said cell={cell} viewer={viewer} />
              </DataCell>
            </Row>
          ))}
        </tbody>
      </Table>
      {viewer.mayConfirm && (
        <ConfirmForm
          address={address}
          cells={cells.map(({ cell, words, unit, toleranceUm }) => ({ cell, words, unit, toleranceUm }))}
          fourEyes={fourEyes}
        />
      )}
      {history.length > 0 && <ValuesHistory history={history} cells={cells} timeZone={viewer.timeZone} />}
    </>
  );
}

function Said({ cell, viewer }: { cell: CellState; viewer: ValuesViewer }) {
  const { holding, waiting } = cell;
  const own = waiting?.accountId === viewer.accountId;
  return (
    <>
      <span className={holding ? '' : 'font-medium text-brass'}>
        {holding ? saidWords(holding, viewer.timeZone) : cellStateWords[cell.state]}
      </span>
      {holding?.remark && <span className="block text-sm text-ink2">{holding.remark}</span>}
      {waiting && (
        <span className="mt-1 block">
          <span className="font-medium text-brass">Waiting for the second person:</span> {waiting.figure} {waiting.unit}
          , {saidWords(waiting, viewer.timeZone)}
          {viewer.mayAgree && !own && <AgreeButton id={waiting.id} what={cell.words} />}
          {viewer.mayAgree && own && (
            <span className="block text-sm text-ink2">Somebody else has to look it up too.</span>
          )}
        </span>
      )}
    </>
  );
}

function ValuesHistory({ history, cells, timeZone }: { history: SaidOfCell[]; cells: CellState[]; timeZone: string }) {
  const words = (cell: string) => cells.find((one) => one.cell === cell)?.words ?? cell;
  return (
    <details className="mt-4 border-y border-line">
      <summary className="flex min-h-12 items-center font-semibold text-blue">
        <span aria-hidden="true" className="mr-2">
          ▸
        </span>
        Everything that was said, {history.length}
      </summary>
      <Table caption="History of the values" className="mb-3">
        <TableHead>
          <HeadCell>Day</HeadCell>
          <HeadCell>Figure of</HeadCell>
          <HeadCell figure>Figure</HeadCell>
          <HeadCell>Said</HeadCell>
          <HeadCell>Second person</HeadCell>
          <HeadCell>Remark</HeadCell>
        </TableHead>
        <tbody>
          {history.map((said) => (
            <Row key={said.id}>
              <DataCell className="whitespace-nowrap">{dayIn(said.recordedAt, timeZone)}</DataCell>
              <DataCell>{words(said.cell)}</DataCell>
              <DataCell figure className="whitespace-nowrap">
                {said.figure === null ? '' : `${said.figure} ${said.unit}`}
              </DataCell>
              <DataCell>
                {said.state} by {said.accountName}
                {said.clause && `: ${said.ofEdition}, ${said.clause}`}
              </DataCell>
              <DataCell>
                {said.secondAccountName && said.secondAt
                  ? `${said.secondAccountName}, ${dayIn(said.secondAt, timeZone)}`
                  : said.needsSecond
                    ? 'not yet'
                    : 'not wanted'}
              </DataCell>
              <DataCell>{said.remark}</DataCell>
            </Row>
          ))}
        </tbody>
      </Table>
    </details>
  );
}
