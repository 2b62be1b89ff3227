/** Lets blocks glide to their next places, so that the eye can follow; a style does it, and reduced motion takes it off. */

/** As in the style sheet, and a little for the last frame. */
const MILLISECONDS = 300;

let ends: ReturnType<typeof setTimeout> | undefined;

export function glide(): void {
  const sheet = document.querySelector('.sheet');
  if (sheet === null) return;
  sheet.classList.add('sheet-gliding');
  clearTimeout(ends);
  ends = setTimeout(() => sheet.classList.remove('sheet-gliding'), MILLISECONDS);
}
