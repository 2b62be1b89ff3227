/** A reader of RFC 4180, character by character, that shares nothing with the writer. */

export function readCsv(text: string): string[][] {
  const records: string[][] = [];
  let record: string[] = [];
  let cell = '';
  let isQuoted = false;
  for (let i = 0; i < text.length; i++) {
    const character = text.charAt(i);
    if (isQuoted) {
      if (character !== '"') cell += character;
      else if (text.charAt(i + 1) === '"') cell += text.charAt(i++);
      else isQuoted = false;
    } else if (character === '"') {
      if (cell !== '') throw new Error('a quote inside a cell that is not quoted');
      isQuoted = true;
    } else if (character === ',') {
      record.push(cell);
      cell = '';
    } else if (character === '\r' && text.charAt(i + 1) === '\n') {
      records.push([...record, cell]);
      [record, cell] = [[], ''];
      i++;
    } else {
      cell += character;
    }
  }
  if (isQuoted || cell !== '' || record.length > 0) throw new Error('the last record does not end');
  return records;
}
