const steps = ['You and your organisation', 'Letterhead', 'Test codes', 'First machine'] as const;

/** Where I am in the first start. */
export function WelcomeSteps({ at }: { at: 0 | 1 | 2 | 3 }) {
  return (
    <ol className="mb-6 flex flex-wrap gap-x-6 gap-y-1 text-sm">
      {steps.map((step, index) => (
        <li
          key={step}
          aria-current={index === at ? 'step' : undefined}
          className={
            index === at ? 'border-b-[3px] border-blue font-semibold' : 'border-b-[3px] border-transparent text-ink2'
          }
        >
          {index + 1} {step}
          {index < at && ', done'}
        </li>
      ))}
    </ol>
  );
}
