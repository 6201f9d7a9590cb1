/** px between two neighbouring ticks; 16 of them make the inch that repeats along the blade. */
const PITCH = 5;

/** Tick lengths in px on a 44 px blade, from sixteenths up to the inch. Longer ones lie over shorter ones. */
const LENGTHS = [4, 5.5, 7, 9, 13] as const;

const TICK_WIDTH = 1.3;

/**
 * CSS background layers for the ticks along a blade's top edge, like those of a real tape: five lengths, the inch longest.
 *
 * @param height - of the blade, px; ticks grow with it
 * @param ink - any CSS colour
 */
export function bladeTicks(
  height: number,
  ink: string,
): { readonly backgroundImage: string; readonly backgroundSize: string } {
  const grow = Math.min(1.25, height / 44);
  const layers = LENGTHS.map((length, order) => ({ length: length * grow, every: PITCH * 2 ** order }));
  return {
    backgroundImage: layers
      .map(() => `linear-gradient(90deg, transparent calc(100% - ${TICK_WIDTH}px), ${ink} 0)`)
      .join(', '),
    backgroundSize: layers.map(({ length, every }) => `${every}px ${length.toFixed(1)}px`).join(', '),
  };
}
