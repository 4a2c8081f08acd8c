/**
 * Targets of a positioning test on a linear axis, whole mm where the travel allows: P_i = (i−1)·p + r_i with |r_i| ≤ 0.3·p, other for
 * each i, so that a periodic error is not met at the same place every time; at least 5 per metre and 5 in all; room at both ends so
 * that the end targets are approached from both sides too (ISO 230-2:2014, from memory). The same axis gets the same targets.
 * @param travelMm travel, mm, above zero
 * @param seed name of the axis
 * @returns decimal strings, rising, mm
 */
export function proposedTargets(travelMm: string, seed: string): string[] {
  const travel = Number(travelMm);
  const count = Math.max(5, Math.ceil((travel * 5) / 1000));
  const step = travel >= 40 ? 1 : 0.1;
  const room = Math.max(step, Math.floor((travel * 0.02) / step) * step);
  const pitch = (travel - 2 * room) / (count - 1);
  let state = [...seed].reduce((sum, sign) => (sum * 31 + sign.charCodeAt(0)) % 997, 7);
  const offsets = new Set<number>();
  return Array.from({ length: count }, (_, i) => {
    const base = room + i * pitch;
    const least = i === 0 ? 0 : -0.3 * pitch;
    const most = i === count - 1 ? 0 : 0.3 * pitch;
    // The end targets move inward only; the figure that is proposed must itself keep within 0.3·p.
    const [first, last] = [Math.ceil((base + least) / step), Math.floor((base + most) / step)];
    state = (state * 57 + 29) % 997;
    const wanted = first + Math.floor((state / 997) * (last - first + 1));
    const choices = Array.from(
      { length: last - first + 1 },
      (_, k) => first + ((wanted - first + k) % (last - first + 1)),
    );
    const offset = (place: number) => Math.round((place * step - base) * 1000);
    const place = choices.find((choice) => !offsets.has(offset(choice))) ?? wanted;
    offsets.add(offset(place));
    return (place * step).toFixed(step < 1 ? 1 : 0);
  });
}
