import type { ReactNode } from 'react';
import { componentName } from '@/lib/planning/component-words';
import { drivenToolWords, type MakeUp, machineKinds } from '@/lib/schemas/make-up';

const criteria = {
  'swing-over-bed': 'swing over bed',
  'bar-diameter': 'bar diameter',
  'chuck-diameter': 'chuck diameter',
} as const;

const sizes: [keyof MakeUp, string][] = [
  ['distanceBetweenCentresMm', 'distance between centres'],
  ['swingOverBedMm', 'swing over bed'],
  ['swingOverCrossSlideMm', 'swing over cross slide'],
  ['chuckDiameterMm', 'chuck diameter'],
  ['barDiameterMm', 'bar diameter'],
];

/** What the machine consists of, in words. */
export function MakeUpWords({ makeUp }: { makeUp: MakeUp }) {
  const known = sizes.filter(([key]) => makeUp[key]);
  return (
    <dl className="grid gap-3 text-[15px]">
      <Part name="Kind">
        {machineKinds[makeUp.kind]},{' '}
        {makeUp.channels.length === 1 ? 'one channel' : `${makeUp.channels.length} channels`}
      </Part>
      <Part name="Size class by">
        {criteria[makeUp.sizeClass.criterion]} <Figure>{makeUp.sizeClass.valueMm}</Figure> mm
      </Part>
      <Part name="Spindles">
        {makeUp.spindles.map(({ id, carriedBy, onTurret }) => (
          <Line key={id}>
            {componentName(id, makeUp)}
            {carriedBy && `, carried by ${carriedBy}`}
            {onTurret && `, rides on ${componentName(onTurret, makeUp)}`}
          </Line>
        ))}
      </Part>
      <Part name="Turrets and posts">
        {makeUp.turrets.map(({ id, stations, axes, worksAt, drivenTools = 'none' }) => (
          <Line key={id}>
            {componentName(id, makeUp)}, {stations} stations{axes.length > 0 && `, moves in ${axes.join(' ')}`}, works
            at {worksAt.join(' and ')}
            {drivenTools !== 'none' && `, driven tools ${drivenToolWords[drivenTools]}`}
          </Line>
        ))}
      </Part>
      <Part name="Linear axes">
        {makeUp.linearAxes.map(({ id, carries, travelMm, programmedOn, directionNote }) => (
          <Line key={id}>
            <span className="font-mono">{id}</span> carries {carries}, travel <Figure>{travelMm}</Figure> mm, programmed
            on {programmedOn}
            {directionNote && `; ${directionNote}`}
          </Line>
        ))}
      </Part>
      {makeUp.rotaryAxes.length > 0 && (
        <Part name="Rotary axes">
          {makeUp.rotaryAxes.map(({ id, carries }) => (
            <Line key={id}>
              <span className="font-mono">{id}</span> turns {carries}
            </Line>
          ))}
        </Part>
      )}
      {(makeUp.tailstock || makeUp.guideBush || makeUp.toolChanger) && (
        <Part name="Besides">
          {[
            makeUp.tailstock && `tailstock ${makeUp.tailstock.id}`,
            makeUp.guideBush && `guide bush ${makeUp.guideBush.id}`,
            makeUp.toolChanger && `tool changer ${makeUp.toolChanger.id}`,
          ]
            .filter(Boolean)
            .join(', ')}
        </Part>
      )}
      {known.length > 0 && (
        <Part name="Sizes">
          {known.map(([key, words]) => (
            <Line key={key}>
              {words} <Figure>{String(makeUp[key])}</Figure> mm
            </Line>
          ))}
        </Part>
      )}
    </dl>
  );
}

function Part({ name, children }: { name: string; children: ReactNode }) {
  return (
    <div className="grid gap-x-4 sm:grid-cols-[9rem_1fr]">
      <dt className="text-sm text-ink2">{name}</dt>
      <dd>{children}</dd>
    </div>
  );
}

const Line = ({ children }: { children: ReactNode }) => <span className="block">{children}</span>;
const Figure = ({ children }: { children: ReactNode }) => <span className="font-mono">{children}</span>;
