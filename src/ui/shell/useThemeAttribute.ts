/** Puts the chosen theme on the document's root; the system decides where none is chosen. */

import { useEffect } from 'react';
import { type State, useStore } from '../store/index.ts';

const theme = (state: State) => state.view.theme;

export function useThemeAttribute(): void {
  const chosen = useStore(theme);
  useEffect(() => {
    if (chosen === null) delete document.documentElement.dataset['theme'];
    else document.documentElement.dataset['theme'] = chosen;
  }, [chosen]);
}
