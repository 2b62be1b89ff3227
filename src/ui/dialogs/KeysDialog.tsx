/** The page of all keys, one key away. */

import { Dialog } from './Dialog.tsx';

const KEYS: readonly { readonly group: string; readonly keys: readonly (readonly [string, string])[] }[] = [
  {
    group: 'Place a block',
    keys: [
      ['U  Y', 'an input, an output'],
      ['G  A  I', 'a gain, a summing point, an integrator'],
      ['F  D  C', 'a transfer function, a dead time, a limiter'],
      ['0–9  (  +  -  @  Shift+letter', 'write a block: opens the line with that character'],
      ['Tab  ↓  in the line', 'complete the name of a parameter, or of a block after @'],
      ['K = 3.5  @sum-  in the line', 'a gain with its value; a wire to the block sum with minus'],
    ],
  },
  {
    group: 'On a slider',
    keys: [
      ['← →  with Shift', 'move the value finely, coarsely'],
      ['Home  End', 'to the ends of its range'],
      ['Enter  double click', 'change its range'],
      ['Escape', 'bring the value back'],
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
      ['Delete  Backspace', 'remove what is selected, with Shift so that the wires close behind'],
      ['H  Alt+drag', 'pull a block out of its wires, which close behind it'],
      ['S', 'turn the sign of the wire drawn last to a summing point'],
      ['L', 'arrange the selected blocks, or the whole drawing'],
      ['Ctrl+D', 'duplicate'],
      ['C', 'cut the selected wire to measure margins there, or take the cut away; with no wire selected, a limiter'],
      ['Ctrl+C  Ctrl+X  Ctrl+V', 'copy, cut, paste: as a drawing in text, from window to window'],
      ['Alt+← → ↑ ↓', 'align the selected blocks at their edges'],
      ['Alt+C  Alt+Shift+C', 'align their centres in a row, in a column'],
      ['Alt+S  Alt+Shift+S', 'spread them evenly across, down'],
      ['Shift+drag', 'select by a frame'],
      ['Ctrl+A', 'select everything'],
      ['Escape', 'let go of what is selected or begun'],
    ],
  },
  {
    group: 'Texts and frames',
    keys: [
      ['T  double click on paper', 'write a text: Enter keeps it, Shift+Enter begins a line, Escape leaves it'],
      ['B', 'a frame around the selected blocks'],
      ['" in the line', 'a text in quotes goes onto the sheet'],
      ['Enter  double click', 'write the selected one anew'],
      ['← → ↑ ↓  with Shift', 'move it by one square, by five; a frame with all that stands in it'],
      ['Alt+← → ↑ ↓', 'make it narrower, wider, lower, higher'],
    ],
  },
  {
    group: 'On a wire',
    keys: [
      ['N', 'select the next wire at the selected block or wire'],
      ['← → ↑ ↓', 'bend the selected wire'],
      ['R  double click', 'take its bends out'],
      ['+  -', 'set its sign at the summing point it ends at'],
      ['G  A  I  F', 'place a block into the selected wire'],
    ],
  },
  {
    group: 'In the system matrix',
    keys: [
      ['← → ↑ ↓  Home  End', 'go to an entry: its action paths light up and are said'],
      ['Enter  click', 'keep it'],
      ['Escape', 'let go of it'],
    ],
  },
  {
    group: 'See',
    keys: [
      ['Z', 'fit the drawing to the sheet'],
      ['Ctrl+F', 'find a block by name, value or parameter'],
      ['+  −  with Ctrl', 'zoom of the browser; wheel or pinch zooms the sheet'],
    ],
  },
  {
    group: 'Everywhere',
    keys: [
      ['Ctrl+Z', 'undo'],
      ['Ctrl+Y  Ctrl+Shift+Z', 'redo'],
      ['Ctrl+E', 'export'],
      ['P  Ctrl+P', 'print the sheet on one page, with its title block; P over the sheet'],
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
