/** Bytes to a file of the user's, by the browser's own download. */

/** The drawing's title as a file name that every system takes, or `drawing`. */
export function fileName(title: string, extension: string): string {
  const stem = title
    .normalize('NFKD')
    .replaceAll(/[^A-Za-z0-9]+/g, '-')
    .replaceAll(/^-+|-+$/g, '')
    .toLowerCase()
    .slice(0, 80);
  return `${stem || 'drawing'}.${extension}`;
}

/** The browser fetches the bytes after the click, on a busy machine noticeably later. */
const MILLISECONDS_HELD = 10_000;

export function saveFile(name: string, content: Blob): void {
  const address = URL.createObjectURL(content);
  const link = document.createElement('a');
  link.href = address;
  link.download = name;
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), MILLISECONDS_HELD);
}
