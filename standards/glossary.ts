export interface GlossaryTerm {
  term: string;
  /** Other words for the same, as they occur in texts. */
  also?: string[];
  text: string;
}

/** Trade words in our own sentences, sorted by term. */
export const glossary: GlossaryTerm[] = [
  {
    term: 'accuracy',
    also: ['bidirectional accuracy'],
    text: 'How far an axis may end up from where it was sent, systematic error and scatter together. ISO 230-2 calls it A.',
  },
  {
    term: 'adjusting',
    text: 'Readings taken while the machine is being corrected. They are kept, but neither the first nor the final state.',
  },
  {
    term: 'alignment',
    text: 'Bringing axes and spindles into their relation to each other: parallel, square, coaxial, on one height.',
  },
  { term: 'as found', text: 'The state before anything was touched. Its readings are never overwritten.' },
  { term: 'as left', text: 'The state in which the machine is handed over.' },
  {
    term: 'asynchronous error motion',
    also: ['asynchronous'],
    text: 'The part of a spindle’s error that does not come back at the same angle turn after turn.',
  },
  {
    term: 'autocollimator',
    text: 'An optical instrument that sees the tilt of a mirror. It does not see turning about its own line of sight.',
  },
  {
    term: 'axial slip',
    also: ['periodic axial slip'],
    text: 'To-and-fro of a spindle along its own axis once or more in a turn, read on a ball in its centre.',
  },
  { term: 'backlash', text: 'Mechanical play between screw and nut or gear teeth; one part of lost motion.' },
  {
    term: 'bracket sag',
    also: ['sag of the bracket'],
    text: 'How far an indicator’s bracket hangs down. A sweep reads twice of it between top and bottom.',
  },
  {
    term: 'camming',
    text: 'Run-out of a face: the face goes to and fro along the axis while it turns, slip included.',
  },
  {
    term: 'centre height',
    also: ['on centre'],
    text: 'Height of the tool’s edge at the spindle axis. A tool off centre turns small diameters wrong by about h²/r.',
  },
  { term: 'centring diameter', text: 'The short cone or cylinder of the spindle nose that centres the chuck.' },
  {
    term: 'circular test',
    text: 'Two axes run a circle and the path is compared with it. Its shape tells squareness, scale, reversal and lag.',
  },
  {
    term: 'clamping',
    text: 'Holding a part or a slide so that it cannot move. What is clamped differently reads differently.',
  },
  {
    term: 'coaxiality',
    also: ['coaxial'],
    text: 'How far two axes stand beside each other at a stated place. A total reading shows twice of it.',
  },
  {
    term: 'compensation',
    text: 'Values in the control that take known errors off the motion. Whether they were active belongs to every result.',
  },
  {
    term: 'concave',
    text: 'Deeper in the middle than at the rim. A lathe may face concave, so that parts stand on their rim.',
  },
  { term: 'convex', text: 'Proud in the middle. A face that is convex rocks.' },
  {
    term: 'cosine error',
    text: 'A lever indicator at an angle reads too much: the true way is the reading times the cosine of the angle.',
  },
  { term: 'cycle', also: ['run'], text: 'One pass through all targets in one direction.' },
  { term: 'deviation', text: 'The one figure that a test gives and that is judged.' },
  {
    term: 'dial indicator',
    also: ['indicator', 'lever indicator'],
    text: 'An instrument that shows how far its plunger or lever is moved. Pushing it in counts positive here.',
  },
  {
    term: 'dowel',
    also: ['pin'],
    text: 'A pin that keeps two parts in their place. It is set last, when everything else is right.',
  },
  { term: 'drift', text: 'A slow change of place over time, mostly by temperature.' },
  {
    term: 'eccentricity',
    text: 'Distance of a part’s centre from the axis on which it turns; run-out without form error is twice of it.',
  },
  { term: 'error motion', text: 'What an axis of rotation does besides turning.' },
  { term: 'flatness', text: 'Distance of the two parallel planes that hold a surface.' },
  { term: 'gang slide', text: 'A slide that carries tools beside each other instead of in a turret.' },
  { term: 'guide bush', text: 'A bush close to the tool that supports the bar on sliding-head machines.' },
  { term: 'headstock', text: 'The part that carries the work spindle.' },
  { term: 'hysteresis', text: 'A reading that depends on the direction from which it was reached.' },
  { term: 'indexing', text: 'Turning a turret from one station to another and holding it there.' },
  { term: 'interlock', text: 'A device that lets nothing dangerous move while a guard is open. It is never defeated.' },
  { term: 'jack', also: ['jacking'], text: 'A screw that lifts a part by small amounts.' },
  {
    term: 'least-squares line',
    also: ['least squares', 'least-squares'],
    text: 'The line for which the sum of the squared distances is least.',
  },
  {
    term: 'level',
    also: ['levelling'],
    text: 'An instrument that shows slope against gravity; also the state in which slopes are as they should be.',
  },
  {
    term: 'limit',
    text: 'The figure that must not be passed; under guarded acceptance the tolerance less a guard band.',
  },
  {
    term: 'local tolerance',
    also: ['local limit'],
    text: 'A limit that must hold over any part of a stated length, besides the one for the whole.',
  },
  { term: 'lost motion', text: 'What a slide lacks after a reversal: play, wind-up and friction together.' },
  {
    term: 'mandrel',
    also: ['test mandrel'],
    text: 'A ground bar that makes the axis of a spindle or hole measurable.',
  },
  {
    term: 'measuring length',
    text: 'The length over which it could really be measured; tolerances given per length follow it.',
  },
  {
    term: 'minimum zone',
    also: ['minimum-zone'],
    text: 'The narrowest strip, slab or ring that holds all points. Its width is the smallest honest figure.',
  },
  {
    term: 'parallelism',
    also: ['parallel'],
    text: 'The small angle between a motion and an axis or another motion in a plane, given as µm over a length.',
  },
  {
    term: 'pitch',
    text: 'Nodding of a slide: turning about the axis across its travel. Labels pitch, yaw and roll depend on how the bed slants.',
  },
  { term: 'polygon', text: 'A many-sided mirror that turns with an axis, so that an autocollimator sees its angle.' },
  { term: 'positioning', text: 'How well an axis comes to the place to which it is sent.' },
  { term: 'quill', text: 'The sleeve of the tailstock that moves out to the part.' },
  {
    term: 'reference point',
    also: ['reference', 'reference mark'],
    text: 'The place from which an axis counts. Shifting it moves everything that counts from it.',
  },
  {
    term: 'repeatability',
    text: 'How well the same place is found again. ISO 230-2 takes four times the estimated scatter.',
  },
  {
    term: 'resolution',
    text: 'The smallest step that an instrument shows; also the step to which a result is rounded.',
  },
  {
    term: 'reversal',
    also: ['turned over', 'half a turn'],
    text: 'Measuring once more with mandrel, square or straightedge turned, so that its own error drops out of the mean.',
  },
  { term: 'roll', text: 'Turning of a slide about the line along which it travels.' },
  { term: 'roundness', text: 'Distance of two concentric circles that hold a section.' },
  {
    term: 'run-out',
    text: 'What an indicator shows on a turning part in one turn: eccentricity, form and error motion together.',
  },
  {
    term: 'sensitive direction',
    text: 'The direction in which an error shows fully on the part; in turning it stands still, at the tool.',
  },
  {
    term: 'shim',
    also: ['shimmed'],
    text: 'A thin, flat piece put under a part to lift it; one piece, free of burrs.',
  },
  { term: 'soft foot', text: 'A foot that does not carry until its screw pulls the casting down to it.' },
  { term: 'spindle nose', also: ['nose'], text: 'The end of the spindle on which the chuck sits.' },
  { term: 'square', text: 'A block or arm with two faces at 90°. Turned over, it gives its own error away.' },
  {
    term: 'squareness',
    text: 'Difference of an angle from 90°, given as µm over a length. More than 90° counts positive here.',
  },
  { term: 'straightedge', text: 'A long, straight and stiff piece along which a motion is read.' },
  { term: 'straightness', text: 'Width of a profile about a stated line. Which line it was is always said.' },
  { term: 'sub-spindle', text: 'The second work spindle, which takes the part over.' },
  {
    term: 'sweep',
    also: ['swept'],
    text: 'Carrying an indicator round a mandrel or bore by turning the spindle that holds it.',
  },
  {
    term: 'synchronous error motion',
    also: ['synchronous'],
    text: 'The part of a spindle’s error that comes back at the same angle in every turn.',
  },
  { term: 'tailstock', text: 'The part that supports the free end of a long workpiece.' },
  { term: 'tolerance', text: 'The figure that a deviation may reach. Where it comes from stands beside it.' },
  {
    term: 'total indicator reading',
    also: ['total reading'],
    text: 'Largest less smallest reading over a turn. It is twice an offset.',
  },
  { term: 'transfer position', text: 'The place where the sub-spindle takes the part over.' },
  { term: 'turret', text: 'A tool carrier that turns its stations in front of the work.' },
  { term: 'twist', text: 'A bed that is turned against itself along its length, seen by a level across it.' },
  { term: 'uncertainty', text: 'How far the true value may lie from the stated one, with a stated probability.' },
  {
    term: 'working order',
    text: 'What others rest on comes first: level, spindle, slides, turret, sub-spindle, lost motion, reference points, positioning, cutting.',
  },
  { term: 'yaw', text: 'Turning of a slide about the axis that stands upright on its travel.' },
];
