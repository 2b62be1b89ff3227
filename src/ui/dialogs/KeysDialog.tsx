/** The page of all keys, one key away. */

import { Dialog } from './Dialog.tsx';

const KEYS: readonly { readonly group: string; readonly keys: readonly (readonly [string, string])[] }[] = [
  {
    group: 'Place a block',
    keys: [
      ['U  Y', 'an input, an output'],
      ['G  A  I', 'a gain, a summing point, an integrator'],
      ['F', 'a transfer function'],
      ['0–9  (  +  -  Shift+letter', 'write a block: opens the line with that character'],
    ],
  },
  {
    group: 'On the sheet',
    keys: [
      ['Tab', 'into the sheet, then from block to block'],
      ['Enter', "open the block's fields"],
      ['← → ↑ ↓', 'move the selected blocks by one square, with Shift by five'],
      ['W', 'wire the selected block: choose where to with Tab, Enter connects'],
      ['M', 'mirror'],
      ['Delete  Backspace', 'remove what is selected'],
      ['Ctrl+A', 'select everything'],
      ['Escape', 'let go of what is selected or begun'],
    ],
  },
  {
    group: 'See',
    keys: [
      ['Z', 'fit the drawing to the sheet'],
      ['+  −  with Ctrl', 'zoom of the browser; wheel or pinch zooms the sheet'],
    ],
  },
  {
    group: 'Everywhere',
    keys: [
      ['Ctrl+Z', 'undo'],
      ['Ctrl+Y  Ctrl+Shift+Z', 'redo'],
      ['Ctrl+E', 'export'],
      ['?', 'this page'],
    ],
  },
];

export function KeysDialog() {
  return (
    <Dialog title="Keys">
      {KEYS.map(({ group, keys }) => (
        <section key={group}>
          <h3>{group}</h3>
          <table className="dialog-table" aria-label={group}>
            <tbody>
              {keys.map(([key, does]) => (
                <tr key={key}>
                  <th scope="row">
                    <kbd>{key}</kbd>
                  </th>
                  <td>{does}</td>
                </tr>
              ))}
            </tbody>
          </table>
        </section>
      ))}
    </Dialog>
  );
}
