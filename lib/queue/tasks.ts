import type { TaskList } from 'graphile-worker';
import { z } from 'zod';
import { deliverOutboxMail } from '@/lib/queue/deliver-outbox-mail';
import { renderReport } from '@/lib/queue/render-report';

const mailPayload = z.object({ organisationId: z.uuid(), outboxId: z.uuid() });
const reportPayload = z.object({ organisationId: z.uuid(), reportId: z.uuid() });

/**
 * Everything the worker does. Each task may run more than once for the same payload (a worker can die between the
 * work and the note that it is done), so each must come to the same end when it is repeated.
 */
export const tasks: TaskList = {
  'send-mail': async (payload) => {
    const { organisationId, outboxId } = mailPayload.parse(payload);
    await deliverOutboxMail(organisationId, outboxId);
  },
  'render-report': async (payload) => {
    const { organisationId, reportId } = reportPayload.parse(payload);
    await renderReport(organisationId, reportId);
  },
};
