import { ProvenanceLine } from '@/components/catalogue/tolerance-table';
import { SectionTitle } from '@/components/ui/page-title';
import { DataCell, HeadCell, Row, RowHead, Table, TableHead } from '@/components/ui/table';
import type { GuideField, MethodGuide } from '@/lib/explaining/methods/method-guide';

/** What a method is for, its formulas, signs, fields and source. */
export function GuideView({ guide }: { guide: MethodGuide }) {
  const { purpose, formulas, sign, sensitiveTo, source, inputs, outputs } = guide;
  return (
    <>
      <SectionTitle>What it is for</SectionTitle>
      <p className="max-w-prose">{purpose}</p>
      <SectionTitle>Formula</SectionTitle>
      <ul className="grid gap-1 font-mono text-[15px]">
        {formulas.map((formula) => (
          <li key={formula}>{formula}</li>
        ))}
      </ul>
      <ProvenanceLine provenance={source} />
      {sign && (
        <>
          <SectionTitle>Sign</SectionTitle>
          <p className="max-w-prose">{sign}</p>
        </>
      )}
      <SectionTitle>What it is sensitive to</SectionTitle>
      <ul className="grid max-w-prose list-disc gap-1 pl-6">
        {sensitiveTo.map((sentence) => (
          <li key={sentence}>{sentence}</li>
        ))}
      </ul>
      <SectionTitle note="Names as in a request">What goes in</SectionTitle>
      <FieldList caption="What goes in" fields={inputs} />
      <SectionTitle note="Besides the figure that is judged">What comes out</SectionTitle>
      <FieldList caption="What comes out" fields={outputs} />
    </>
  );
}

function FieldList({ caption, fields }: { caption: string; fields: GuideField[] }) {
  return (
    <Table caption={caption}>
      <TableHead>
        <HeadCell>Name</HeadCell>
        <HeadCell>Meaning</HeadCell>
        <HeadCell>Unit</HeadCell>
      </TableHead>
      <tbody>
        {fields.map(({ name, words, unit, optional }) => (
          <Row key={name}>
            <RowHead className="font-mono font-normal">{name}</RowHead>
            <DataCell>
              {words}
              {optional && <span className="text-ink2"> (may be left out)</span>}
            </DataCell>
            <DataCell className="text-sm text-ink2">{unit}</DataCell>
          </Row>
        ))}
      </tbody>
    </Table>
  );
}
