/**
 * From isolated roots to answers: steps with more bits, each with its bound, until a reading of the disc is decided. Comes
 * after root-isolation.ts; the reading is a rounding of root-rounding.ts.
 */

import { MOST_BITS, smaller } from './root-isolation.ts';
import { type Site, views, withBits } from './root-sites.ts';
import { newtonAt, type Subject, stepped } from './root-steps.ts';

/** Bits that a disc gains at least, on average, when it was too large to be read. */
const MORE_BITS = 64;

/**
 * The readings of all sites in their order, one list; null where a site is still unreadable at `MOST_BITS`. `read` gives null
 * for a disc that is too large for it.
 */
export function sharpenedUntil<T>(
  subject: Subject,
  isolated: readonly Site[],
  read: (site: Site) => readonly T[] | null,
): T[] | null {
  const sites = [...isolated];
  const readings = sites.map(read);
  while (readings.includes(null)) {
    const unread = readings.flatMap((reading, i) => (reading === null ? [i] : []));
    for (const i of unread) sites[i] = withBits(sites[i]!, sites[i]!.bits + MORE_BITS);
    if (unread.some(i => sites[i]!.bits > MOST_BITS)) return null;
    const seen = views(sites);
    for (const i of unread) {
      const site = sites[i]!;
      sites[i] = smaller(site, stepped(site, newtonAt(subject, site), seen[i]!));
      readings[i] = read(sites[i]!);
    }
  }
  return readings.flatMap(reading => reading ?? []);
}
