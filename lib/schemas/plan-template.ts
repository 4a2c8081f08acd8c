import { z } from 'zod';
import { id, line } from './common';

/** A plan is kept as a template for machines of its maker and model; the same name puts the new one in the old one's place. */
export const planTemplateForm = z.object({ jobId: id, name: line('The name', 80) });

export const planTemplateQuery = z.object({
  manufacturer: z.string().trim().max(120).optional(),
  model: z.string().trim().max(120).optional(),
});
