import Link from 'next/link';

/** Machines in short, one a line. */
export function MachineLinks(props: {
  machines: { id: string; manufacturer: string; model: string; serialNumber: string }[];
}) {
  return (
    <ul className="divide-y divide-hair border-y border-hair">
      {props.machines.map(({ id, manufacturer, model, serialNumber }) => (
        <li key={id}>
          <Link href={`/machines/${id}`} className="flex min-h-12 flex-wrap items-baseline gap-x-5 py-2.5">
            <span className="font-mono text-blue underline">{serialNumber}</span>
            <span>
              {manufacturer} {model}
            </span>
          </Link>
        </li>
      ))}
    </ul>
  );
}
