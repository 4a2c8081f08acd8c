import type { ReportSource } from '@/db/read-models/report-source';
import { annex } from '@/lib/explaining/annex';
import { buildReportModel } from '@/lib/reporting/build-report-model';
import { formatTime } from '@/lib/reporting/format-time';
import type { ReportModel } from '@/lib/reporting/report-model';
import { version } from '@/lib/version';

interface Issuing {
  number: string;
  revision: number;
  at: Date;
  by: { name: string; functionTitle: string | null };
}

/** The report of a job as it stands: a draft to look at, or the document that is being issued. */
export function buildReport(source: ReportSource, issuing: Issuing | null, withAnnex = false): ReportModel {
  const { board, organisation } = source;
  const at = issuing && formatTime(issuing.at, organisation.timeZone);
  const { handedIn } = source;
  const named = board.people.find((person) => person.role === 'inspector');
  const model = buildReportModel({
    stored: board,
    changes: source.changes,
    machine: {
      manufacturer: board.machine.manufacturer,
      model: board.machine.model,
      serialNumber: board.machine.serialNumber,
      year: board.machine.year,
      ...source.machine,
    },
    customerName: board.customer.name,
    organisation,
    document: {
      number: issuing?.number ?? 'DRAFT',
      revision: issuing?.revision ?? 0,
      state: issuing ? 'issued' : 'draft',
      issuedAt: at,
      issuedBy: issuing?.by.name ?? null,
      checkedBy: issuing?.by.name ?? null,
      programVersion: version,
    },
    inspector: handedIn
      ? { name: handedIn.name, at: formatTime(handedIn.at, organisation.timeZone) }
      : named
        ? { name: named.name, at: null }
        : null,
    reviewer: issuing && at ? { name: issuing.by.name, function: issuing.by.functionTitle, at } : null,
    remarks: source.remarks.map((remark) => ({
      no: remark.number,
      sheetOrder: remark.sheetPosition,
      text: remark.text,
      owner: remark.owner,
      due: remark.dueOn,
      closed: remark.closedAt && formatTime(remark.closedAt, organisation.timeZone),
    })),
  });
  return withAnnex ? { ...model, annex: annex(board) } : model;
}
