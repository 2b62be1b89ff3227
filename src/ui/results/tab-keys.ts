/** Moving through tabs by keyboard, as the tab pattern of the WAI-ARIA Authoring Practices has it. */

/** The index that `key` leads to from `index` among `count` tabs, around the ends; null where the key does not move. */
export function tabAfter(key: string, index: number, count: number): number | null {
  switch (key) {
    case 'ArrowRight':
      return (index + 1) % count;
    case 'ArrowLeft':
      return (index + count - 1) % count;
    case 'Home':
      return 0;
    case 'End':
      return count - 1;
    default:
      return null;
  }
}
