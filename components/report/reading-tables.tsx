import type { PassBlock } from '@/lib/reporting/report-model';

type ReadingTable = PassBlock['tables'][number];

/** The readings of one pass, as they were typed, in the column's unit. */
export function ReadingTables({ tables, name }: { tables: ReadingTable[]; name: string }) {
  return (
    <div className="flex flex-wrap gap-x-8 gap-y-2">
      {tables.map((table, index) => (
        <OneTable key={index} table={table} name={[name, table.title].filter(Boolean).join(', ')} />
      ))}
    </div>
  );
}

function OneTable({ table, name }: { table: ReadingTable; name: string }) {
  const cells = Math.max(0, ...table.rows.map((row) => row.cells.length));
  // Where only the cells are named, the column of places has no head.
  const heads = table.columns.length > cells ? table.columns : ['', ...table.columns];
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a region that scrolls must be reachable by keyboard
    <section className="mt-1 max-w-full overflow-x-auto" tabIndex={0} aria-label={name}>
      {table.title && <p className="text-sm text-ink2">{table.title}</p>}
      <table className="w-max border-collapse text-sm">
        <caption className="sr-only">{name}</caption>
        <thead className="border-b-[1.5px] border-ink">
          <tr>
            {heads.map((head, index) =>
              head === '' ? (
                <td key={index} />
              ) : (
                <th
                  key={index}
                  scope="col"
                  className={`px-1.5 py-1 align-bottom font-semibold text-ink2 ${index ? 'text-right' : 'pl-0 text-left'}`}
                >
                  {head}
                </th>
              ),
            )}
          </tr>
        </thead>
        <tbody>
          {table.rows.map((row) => (
            <tr key={row.label} className="border-b border-hair">
              <th scope="row" className="whitespace-nowrap py-0.5 pr-3 text-left font-mono font-normal text-ink2">
                {row.label}
              </th>
              {row.cells.map((cell, index) => (
                <td key={index} className="px-1.5 py-0.5 text-right font-mono tabular-nums">
                  {cell}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}
