import type { useApiForm } from '@/components/forms/use-api-form';
import { ownDefinitionProblems } from '@/lib/planning/own-definition-problems';
import { newOwnDefinition, type OwnDefinitionInput } from '@/lib/schemas/own-definition';

/** The composer's fields, checked by the same rules as on the server: the schema first, then what does not hold together. */
export const composerSchema = newOwnDefinition.superRefine(({ form }, context) => {
  for (const { pointer, detail } of ownDefinitionProblems(form))
    context.addIssue({ code: 'custom', path: ['form', ...pointer.slice(1).split('/')], message: detail });
});

export type ComposerForm = ReturnType<typeof useApiForm<typeof composerSchema>>;

/** What stands in the fields, whatever the kind of layout, tolerance or component that was chosen. */
export type Typed = OwnDefinitionInput;

/**
 * Fields of one kind among several (a layout, a tolerance) have paths that no type can name all at once; this is the one place where
 * such a path is taken as it stands.
 */
export const at = (path: string) => `form.${path}` as 'form.title';
