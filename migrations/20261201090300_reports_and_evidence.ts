import type { Knex } from 'knex';
import { createTenantTable, dropTables, replaceReadPolicy } from '@/db/tenant-table';

/** What has left the office: a draft or a checked report is nobody's business outside. */
const out = `state in ('issued', 'signed', 'signed-with-remarks', 'refused', 'superseded')`;
const jobSeen = (column: string) =>
  `exists (select 1 from jobs j where j.organisation_id = (select app_organisation()) and j.id = ${column})`;
const reportSeen = `exists (select 1 from reports r where r.organisation_id = (select app_organisation()) and r.id = report_id)`;

export async function up(knex: Knex): Promise<void> {
  await createTenantTable(knex, {
    name: 'reports',
    columns: `
      job_id uuid not null,
      number text not null,
      revision integer not null default 1,
      state text not null check (state in ('checked', 'issued', 'signed', 'signed-with-remarks', 'refused', 'superseded')),
      -- Frozen when it is issued; a trigger keeps it so.
      -- Kept as text, so that its hash can be recomputed from what is stored.
      model json not null,
      model_sha256 text not null,
      pdf_state text not null default 'waiting' check (pdf_state in ('waiting', 'ready', 'failed')),
      -- As issued, and the same with the customer's signature.
      pdf_file_id uuid,
      signed_pdf_file_id uuid,
      pdf_error_id text,
      issued_by uuid,
      issued_at timestamptz not null,
      signed_at timestamptz,
      supersedes uuid,
      version integer not null default 1,
      created_at timestamptz not null default now(),
      unique (organisation_id, number, revision),
      foreign key (organisation_id, job_id) references jobs (organisation_id, id),
      foreign key (organisation_id, pdf_file_id) references files (organisation_id, id),
      foreign key (organisation_id, signed_pdf_file_id) references files (organisation_id, id)`,
    customerReads: `${out} and ${jobSeen('job_id')}`,
    grants: 'select, insert, update',
  });
  await knex.raw('create index reports_job on reports (organisation_id, job_id)');

  await createTenantTable(knex, {
    name: 'signatures',
    columns: `
      report_id uuid not null,
      role text not null check (role in ('inspector', 'reviewer', 'customer')),
      outcome text not null check (outcome in ('measured', 'checked', 'accept', 'accept-with-remarks', 'refuse')),
      name text not null check (name <> ''),
      function_title text,
      company text,
      place text,
      typed text,
      strokes jsonb,
      reason text,
      intent_text text not null,
      intent_language text not null,
      model_sha256 text not null,
      method text not null check (method in ('on-tablet', 'signed-in', 'signing-link')),
      -- On the tablet the inspector is the recorded witness.
      witness text,
      account_id uuid,
      ip text not null,
      user_agent text not null,
      device_time_zone text,
      signed_at timestamptz not null default now(),
      unique (organisation_id, report_id, role),
      foreign key (organisation_id, report_id) references reports (organisation_id, id),
      check (outcome <> 'refuse' or reason <> '')`,
    customerReads: reportSeen,
    customerAdds: `role = 'customer' and account_id = (select app_account()) and ${reportSeen}`,
    grants: 'select, insert',
  });

  await createTenantTable(knex, {
    name: 'remarks',
    columns: `
      job_id uuid not null,
      report_id uuid,
      sheet_id uuid,
      number integer not null,
      text text not null check (text <> ''),
      owner text,
      due_on date,
      closed_at timestamptz,
      closed_by text,
      created_at timestamptz not null default now(),
      unique (organisation_id, job_id, number),
      foreign key (organisation_id, job_id) references jobs (organisation_id, id),
      foreign key (organisation_id, report_id) references reports (organisation_id, id),
      foreign key (organisation_id, sheet_id) references sheets (organisation_id, id)`,
    customerReads: jobSeen('job_id'),
    customerAdds: `report_id is not null and ${reportSeen}`,
    grants: 'select, insert, update',
  });

  await createTenantTable(knex, {
    name: 'outbox',
    columns: `
      recipient text not null,
      subject text not null,
      text_body text not null,
      html_body text not null,
      message_id text not null,
      state text not null default 'waiting' check (state in ('waiting', 'sent', 'failed')),
      attempts integer not null default 0,
      last_error_id text,
      sent_at timestamptz,
      created_at timestamptz not null default now(),
      unique (organisation_id, message_id)`,
    customerReads: 'false',
    customerAdds: 'true',
  });

  await createTenantTable(knex, {
    name: 'audit_events',
    columns: `
      sequence bigint generated always as identity,
      action text not null,
      subject_type text not null,
      subject_id uuid not null,
      account_id uuid,
      account_name text,
      detail jsonb not null default '{}',
      happened_at timestamptz not null default now()`,
    customerReads: 'false',
    customerAdds: 'true',
    grants: 'select, insert',
  });

  await createTenantTable(knex, {
    name: 'idempotency_keys',
    columns: `
      key text not null,
      account_id uuid not null,
      request_hash text not null,
      status integer not null,
      answer jsonb,
      created_at timestamptz not null default now(),
      unique (organisation_id, account_id, key)`,
    customerReads: 'account_id = (select app_account())',
    customerAdds: 'account_id = (select app_account())',
    grants: 'select, insert',
  });

  await createTenantTable(knex, {
    name: 'report_counters',
    columns: `
      year integer not null,
      last integer not null,
      unique (organisation_id, year)`,
    customerReads: 'false',
    grants: 'select, insert, update',
  });

  // The PDF of a report that a customer may read is the customer's too.
  await replaceReadPolicy(
    knex,
    'files',
    `kind = 'report' and exists (select 1 from reports r where r.organisation_id = (select app_organisation()) and files.id in (r.pdf_file_id, r.signed_pdf_file_id))`,
  );

  await knex.raw(`
    -- A customer's signature moves the report's state; nothing else of a report is the customer's to change.
    create policy reports_customer_signs on reports for update
      using (organisation_id = (select app_organisation()) and state = 'issued' and ${jobSeen('job_id')})
      with check (organisation_id = (select app_organisation()) and state in ('signed', 'signed-with-remarks', 'refused'));

    create function reports_are_frozen() returns trigger language plpgsql as $$
    begin
      if new.model::text <> old.model::text or new.model_sha256 <> old.model_sha256 or new.number <> old.number
         or new.revision <> old.revision or new.job_id <> old.job_id or new.issued_at <> old.issued_at
         or new.issued_by is distinct from old.issued_by then
        raise exception 'an issued report does not change' using errcode = 'WM001';
      end if;
      if (old.pdf_file_id is not null and new.pdf_file_id is distinct from old.pdf_file_id)
         or (old.signed_pdf_file_id is not null and new.signed_pdf_file_id is distinct from old.signed_pdf_file_id) then
        raise exception 'the document of a report does not change' using errcode = 'WM001';
      end if;
      if old.state in ('signed', 'signed-with-remarks', 'refused') and new.state not in (old.state, 'superseded') then
        raise exception 'a signed report keeps its outcome' using errcode = 'WM001';
      end if;
      if not app_is_staff() and (new.pdf_file_id is distinct from old.pdf_file_id
         or new.signed_pdf_file_id is distinct from old.signed_pdf_file_id or new.supersedes is distinct from old.supersedes) then
        raise exception 'only the outcome is the signer''s to set' using errcode = 'WM001';
      end if;
      return new;
    end $$;
    create trigger reports_frozen before update on reports for each row execute function reports_are_frozen();

    -- Part of the caller's transaction; the queue's own tables stay out of the application's reach.
    create function enqueue(task text, payload jsonb, job_key text) returns void
      language plpgsql security definer set search_path = public
      as $$
      begin
        if (payload ->> 'organisationId')::uuid <> app_organisation() then
          raise exception 'work is queued for the own organisation only';
        end if;
        perform graphile_worker.add_job(task, payload := payload::json, job_key := job_key, max_attempts := 12);
      end $$;
    revoke execute on function enqueue, reports_are_frozen from public;
    grant execute on function enqueue, reports_are_frozen to witnessmark_app;`);
}

export async function down(knex: Knex): Promise<void> {
  await replaceReadPolicy(knex, 'files', 'false');
  await dropTables(knex, [
    'report_counters',
    'idempotency_keys',
    'audit_events',
    'outbox',
    'remarks',
    'signatures',
    'reports',
  ]);
  await knex.raw('drop function if exists enqueue, reports_are_frozen');
}
