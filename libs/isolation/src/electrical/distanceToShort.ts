/** How the current comes back from a short: along the frame, or along a second conductor of the same kind. */
export type ReturnPath = 'frame' | 'conductor';

/** Metres to a dead short by the ohms of the loop, leads taken off: R / r along the frame, R / 2r with two wires. */
export function distanceToShort(
  loopOhms: number,
  ohmsPerMetre: number,
  path: ReturnPath = 'frame',
): number {
  return loopOhms / (path === 'frame' ? ohmsPerMetre : 2 * ohmsPerMetre);
}

/**
 * The Murray loop: the shorted wire and a sound one, joined at the far end, make the loop of a balanced bridge, in which
 * the short's own ohms drop out. Gives the way along the shorted wire to the short, in the unit of `loop` (metres of
 * both wires together, or ohms): loop × faulty / (faulty + sound), from the bridge arms at the two wires.
 */
export function murrayLoop(loop: number, faulty: number, sound: number): number {
  return (loop * faulty) / (faulty + sound);
}
