/** The page of all keys, one key away. */

import { Dialog } from './Dialog.tsx';
import { keyPages } from './keys-page.ts';

export function KeysDialog() {
  return (
    <Dialog title="Keys">
      {keyPages().map(({ group, lines }) => (
        <section key={group}>
          <h3>{group}</h3>
          <table className="dialog-table" aria-label={group}>
            <tbody>
              {lines.map(({ shown, does }) => (
                <tr key={`${shown} ${does}`}>
                  <th scope="row">
                    <kbd>{shown}</kbd>
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
