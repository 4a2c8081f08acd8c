import type { MakeUpInput } from './make-up';

/**
 * What a form need not ask, because it follows from the rest: an axis is named by letter and number, the channels are those in use, a
 * turret moves in the axes that carry it, and a spindle is carried by the axis that is said to carry it (its Z-like one first). Only a
 * tool spindle rides on a turret; one that does moves with it.
 */
export function linkMakeUp(form: MakeUpInput): MakeUpInput {
  const linearAxes = form.linearAxes.map((axis) => ({
    ...axis,
    id: `${axis.letter}${String(axis.number ?? '').trim()}`,
  }));
  const carrying = (id: string) => linearAxes.filter((axis) => same(axis.carries, id));
  const workSpindles = form.spindles.filter(({ type }) => type !== 'tool').map(({ id }) => tidy(id));
  return {
    ...form,
    channels: channelsIn(form),
    linearAxes,
    spindles: form.spindles.map((spindle) => {
      const { onTurret, ...rest } = spindle;
      const rides = onTurret && form.turrets.some(({ id }) => same(id, onTurret));
      const turret = spindle.type === 'tool' && rides ? { onTurret: tidy(onTurret) } : {};
      const axes = carrying(spindle.id);
      const axis = axes.find(({ letter }) => letter === 'Z' || letter === 'W') ?? axes[0];
      // An axis that was named for a tool spindle without being said to carry it stays, while the machine has it.
      const named = spindle.type === 'tool' ? linearAxes.find(({ id }) => id === spindle.carriedBy) : undefined;
      return { ...rest, ...turret, carriedBy: axis?.id ?? named?.id ?? null };
    }),
    turrets: form.turrets.map((turret) => ({
      ...turret,
      axes: carrying(turret.id).map(({ id }) => id),
      worksAt: turret.worksAt.map(tidy).filter((id) => workSpindles.includes(id)),
    })),
  };
}

const tidy = (id: string) => id.trim().toUpperCase();
const same = (a: string, b: string) => tidy(a) === tidy(b);

function channelsIn(form: MakeUpInput): number[] {
  const parts = [
    ...form.linearAxes,
    ...form.rotaryAxes,
    ...form.spindles,
    ...form.turrets,
    ...(form.tailstock ? [form.tailstock] : []),
    ...(form.guideBush ? [form.guideBush] : []),
    ...(form.toolChanger ? [form.toolChanger] : []),
  ];
  return [...new Set(parts.map(({ channel }) => Number(channel)))]
    .filter((channel) => channel >= 1)
    .sort((a, b) => a - b);
}
