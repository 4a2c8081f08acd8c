import type { MakeUp } from './make-up';

export interface MakeUpProblem {
  path: (string | number)[];
  message: string;
}

/** What no field can see alone: ids, and who carries whom. One sentence a problem, at the field where it is put right. */
export function checkMakeUp(value: MakeUp): MakeUpProblem[] {
  return [
    ...checkIds(value),
    ...checkChannels(value),
    ...checkAxes(value),
    ...checkSpindles(value),
    ...checkTurrets(value),
  ];
}

type Named = { id: string; path: (string | number)[] };

function components(value: MakeUp): Named[] {
  return [
    ...value.spindles.map(({ id }, k) => ({ id, path: ['spindles', k, 'id'] })),
    ...value.turrets.map(({ id }, k) => ({ id, path: ['turrets', k, 'id'] })),
    ...(value.tailstock ? [{ id: value.tailstock.id, path: ['tailstock', 'id'] }] : []),
    ...(value.guideBush ? [{ id: value.guideBush.id, path: ['guideBush', 'id'] }] : []),
    ...(value.toolChanger ? [{ id: value.toolChanger.id, path: ['toolChanger', 'id'] }] : []),
  ];
}

function checkIds(value: MakeUp): MakeUpProblem[] {
  const all: Named[] = [
    ...value.linearAxes.map(({ id }, k) => ({ id, path: ['linearAxes', k, 'id'] })),
    ...value.rotaryAxes.map(({ id }, k) => ({ id, path: ['rotaryAxes', k, 'id'] })),
    ...components(value),
  ];
  const seen = new Set<string>();
  const problems: MakeUpProblem[] = [];
  for (const { id, path } of all) {
    if (seen.has(id))
      problems.push({ path, message: `${id} is already taken. Every axis and component has its own name.` });
    seen.add(id);
  }
  return problems;
}

function checkChannels(value: MakeUp): MakeUpProblem[] {
  const problems: MakeUpProblem[] = [];
  const check = (channel: number, path: (string | number)[]) => {
    if (!value.channels.includes(channel)) problems.push({ path, message: `The machine has no channel ${channel}.` });
  };
  value.linearAxes.forEach((axis, k) => void check(axis.channel, ['linearAxes', k, 'channel']));
  value.rotaryAxes.forEach((axis, k) => void check(axis.channel, ['rotaryAxes', k, 'channel']));
  value.spindles.forEach((spindle, k) => void check(spindle.channel, ['spindles', k, 'channel']));
  value.turrets.forEach((turret, k) => void check(turret.channel, ['turrets', k, 'channel']));
  if (value.tailstock) check(value.tailstock.channel, ['tailstock', 'channel']);
  if (value.guideBush) check(value.guideBush.channel, ['guideBush', 'channel']);
  if (value.toolChanger) check(value.toolChanger.channel, ['toolChanger', 'channel']);
  return problems;
}

function checkAxes(value: MakeUp): MakeUpProblem[] {
  const known = new Set(components(value).map(({ id }) => id));
  const problems: MakeUpProblem[] = [];
  value.linearAxes.forEach((axis, k) => {
    if (axis.id !== `${axis.letter}${axis.number}`)
      problems.push({
        path: ['linearAxes', k, 'id'],
        message: `${axis.id} is not letter ${axis.letter} with number ${axis.number}.`,
      });
    if (!known.has(axis.carries))
      problems.push({
        path: ['linearAxes', k, 'carries'],
        message: `${axis.id} carries ${axis.carries}, which the machine does not have.`,
      });
  });
  value.rotaryAxes.forEach((axis, k) => {
    if (!known.has(axis.carries))
      problems.push({
        path: ['rotaryAxes', k, 'carries'],
        message: `${axis.id} turns ${axis.carries}, which the machine does not have.`,
      });
  });
  return problems;
}

function checkSpindles(value: MakeUp): MakeUpProblem[] {
  const problems: MakeUpProblem[] = [];
  value.spindles.forEach((spindle, k) => {
    if (spindle.onTurret) problems.push(...checkOnTurret(value, k, spindle.id, spindle.type, spindle.onTurret));
    if (spindle.carriedBy === null) return;
    const axis = value.linearAxes.find(({ id }) => id === spindle.carriedBy);
    const path = ['spindles', k, 'carriedBy'];
    if (!axis)
      problems.push({
        path,
        message: `${spindle.id} is carried by ${spindle.carriedBy}, which is no axis of the machine.`,
      });
    else if (spindle.type !== 'tool' && axis.carries !== spindle.id)
      problems.push({ path, message: `${axis.id} is said to carry ${axis.carries}, not ${spindle.id}.` });
  });
  if (!value.spindles.some(({ type }) => type === 'main'))
    problems.push({ path: ['spindles'], message: 'One spindle must be the main spindle.' });
  return problems;
}

function checkOnTurret(value: MakeUp, k: number, id: string, type: string, turret: string): MakeUpProblem[] {
  const path = ['spindles', k, 'onTurret'];
  if (type !== 'tool') return [{ path, message: `${id} is a work spindle; only a tool spindle rides on a turret.` }];
  if (value.turrets.some((candidate) => candidate.id === turret)) return [];
  return [{ path, message: `${id} rides on ${turret}, which is no turret or tool post of the machine.` }];
}

function checkTurrets(value: MakeUp): MakeUpProblem[] {
  const problems: MakeUpProblem[] = [];
  value.turrets.forEach((turret, k) => {
    for (const id of turret.axes) {
      const axis = value.linearAxes.find((candidate) => candidate.id === id);
      if (!axis)
        problems.push({
          path: ['turrets', k, 'axes'],
          message: `${turret.id} moves in ${id}, which is no axis of the machine.`,
        });
      else if (axis.carries !== turret.id)
        problems.push({
          path: ['turrets', k, 'axes'],
          message: `${id} is said to carry ${axis.carries}, not ${turret.id}.`,
        });
    }
    for (const id of turret.worksAt) {
      const spindle = value.spindles.find((candidate) => candidate.id === id);
      if (!spindle)
        problems.push({
          path: ['turrets', k, 'worksAt'],
          message: `${turret.id} works at ${id}, which the machine does not have.`,
        });
      else if (spindle.type === 'tool')
        problems.push({ path: ['turrets', k, 'worksAt'], message: `${id} is a tool spindle; name the work spindle.` });
    }
  });
  return problems;
}
