/**
 * Moves what is seen of the sheet to another view in small steps, so that the eye can follow. A newer glide, a wheel or a press
 * on the sheet ends one where it is.
 */

export interface View {
  readonly x: number;
  readonly y: number;
  readonly zoom: number;
}

export interface ViewKeeper {
  getViewport(): View;
  setViewport(view: View): unknown;
}

let frame: number | null = null;

/** Sets the view at once where `milliseconds` is zero or motion is unwelcome, else gliding over that time. */
export function glideView(keeper: ViewKeeper, to: View, milliseconds: number): void {
  stop();
  const still = window.matchMedia('(prefers-reduced-motion: reduce)').matches;
  if (still || milliseconds === 0) return void keeper.setViewport(to);
  const from = keeper.getViewport();
  const start = performance.now();
  const step = () => {
    const passed = Math.min(1, (performance.now() - start) / milliseconds);
    keeper.setViewport(passed === 1 ? to : viewBetween(from, to, passed));
    frame = passed === 1 ? null : requestAnimationFrame(step);
    if (frame === null) stop();
  };
  const sheet = document.querySelector('.sheet');
  for (const kind of ENDING) sheet?.addEventListener(kind, stop, { capture: true, passive: true });
  frame = requestAnimationFrame(step);
}

const ENDING = ['wheel', 'pointerdown', 'touchstart'] as const;

function stop(): void {
  if (frame !== null) cancelAnimationFrame(frame);
  frame = null;
  const sheet = document.querySelector('.sheet');
  for (const kind of ENDING) sheet?.removeEventListener(kind, stop, { capture: true });
}

/**
 * The view at `passed`, from 0 to 1, of the way: slow at both ends (cubic), the zoom by equal factors. Where the zoom changes, the
 * one point of the sheet that both views have at the same place keeps it, so that a zoom about the centre stays there.
 */
export function viewBetween(from: View, to: View, passed: number): View {
  const eased = passed < 0.5 ? 4 * passed ** 3 : 1 - 4 * (1 - passed) ** 3;
  const zoom = from.zoom * (to.zoom / from.zoom) ** eased;
  const share = from.zoom === to.zoom ? eased : (zoom - from.zoom) / (to.zoom - from.zoom);
  return { x: from.x + share * (to.x - from.x), y: from.y + share * (to.y - from.y), zoom };
}

/** How far the sheet can be seen from and how near. */
export const ZOOM_ENDS = { smallest: 0.03, largest: 4 } as const;

/** A view with the zoom times `factor`, within the ends, about a place in the sheet's own pixels. */
export function zoomedAbout(view: View, [x, y]: readonly [number, number], factor: number): View {
  const zoom = Math.min(ZOOM_ENDS.largest, Math.max(ZOOM_ENDS.smallest, view.zoom * factor));
  const by = zoom / view.zoom;
  return { x: x - by * (x - view.x), y: y - by * (y - view.y), zoom };
}
