/** The id of the write-a-block line's field, by which keys on the sheet reach it. */
export const WRITE_LINE_ID = 'write-a-block';
