import { type Match, markSerial } from '@/lib/schemas/serial-match';

/** The serial number with the found signs underlined; of a similar one those that differ. */
export function MarkedSerial(props: { serialNumber: string; query: string; match: Match }) {
  const { serialNumber, query, match } = props;
  return markSerial(serialNumber, query, match).map(({ text, marked }, index) =>
    marked ? (
      <mark
        key={index}
        className={match === 'slip' ? 'bg-brass-wash font-medium text-brass' : 'bg-blue-wash font-medium text-blue'}
      >
        {text}
      </mark>
    ) : (
      <span key={index}>{text}</span>
    ),
  );
}
