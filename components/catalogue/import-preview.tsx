import { Notice } from '@/components/ui/notice';
import { DataCell, HeadCell, Row, RowHead, Table, TableHead } from '@/components/ui/table';

export interface ImportAnswer {
  lines: number;
  unchanged: number;
  changes: {
    line: number;
    code: string;
    edition: string;
    test: string;
    title: string;
    cell: string;
    figure: string | null;
    unit: string;
    before: string;
    state: 'confirmed' | 'replaced' | 'withdrawn';
  }[];
  problems: { line: number; column: string; detail: string }[];
}

/** What a file would change, line by line, and everything that is wrong in it. */
export function ImportPreview({ found }: { found: ImportAnswer }) {
  const { lines, unchanged, changes, problems } = found;
  return (
    <>
      {problems.length > 0 ? (
        <Notice tone="oxide" title={`The file cannot be taken over: ${problems.length} to put right`} live>
          <Table caption="Problems of the file">
            <TableHead>
              <HeadCell figure>Line</HeadCell>
              <HeadCell>Column</HeadCell>
              <HeadCell>What is wrong</HeadCell>
            </TableHead>
            <tbody>
              {problems.map(({ line, column, detail }) => (
                <Row key={`${line} ${column} ${detail}`}>
                  <DataCell figure>{line}</DataCell>
                  <DataCell className="font-mono">{column || 'whole line'}</DataCell>
                  <DataCell>{detail}</DataCell>
                </Row>
              ))}
            </tbody>
          </Table>
        </Notice>
      ) : (
        <Notice title={`${changes.length} of ${lines} lines change something`} live>
          {unchanged} change nothing.
        </Notice>
      )}
      {changes.length > 0 && (
        <Table caption="What would change" showCaption>
          <TableHead>
            <HeadCell figure>Line</HeadCell>
            <HeadCell>Test</HeadCell>
            <HeadCell>Figure of</HeadCell>
            <HeadCell figure>Now</HeadCell>
            <HeadCell figure>Then</HeadCell>
            <HeadCell>Unit</HeadCell>
            <HeadCell>Said of it</HeadCell>
          </TableHead>
          <tbody>
            {changes.map((change) => (
              <Row key={change.line}>
                <DataCell figure>{change.line}</DataCell>
                <RowHead className="font-normal">
                  <span className="font-mono text-[15px]">{change.test}</span> {change.title}
                </RowHead>
                <DataCell>{change.cell}</DataCell>
                <DataCell figure>{change.before}</DataCell>
                <DataCell figure>{change.figure ?? 'catalogue'}</DataCell>
                <DataCell>{change.unit}</DataCell>
                <DataCell>{change.state}</DataCell>
              </Row>
            ))}
          </tbody>
        </Table>
      )}
    </>
  );
}
