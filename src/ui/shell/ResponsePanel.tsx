/** The tabs under the system matrix and the panel of the selected one. */

import { Suspense, useState } from 'react';
import { Panel, PanelPending, TabPanel, TabStrip } from '../results/index.ts';
import { Picker } from './Picker.tsx';
import { RESULT_TABS } from './result-tabs.ts';

export function ResponsePanel() {
  const [selected, setSelected] = useState(RESULT_TABS[0].id);
  const { id, title, isOfChannel, View } = RESULT_TABS.find(tab => tab.id === selected) ?? RESULT_TABS[0];
  return (
    <Panel title={title} aside={isOfChannel ? <Picker /> : undefined}>
      <TabStrip name="response" label="More of the model" tabs={RESULT_TABS} selected={id} onSelect={setSelected} />
      <TabPanel name="response" id={id}>
        <Suspense fallback={<PanelPending label={title} />}>
          <View />
        </Suspense>
      </TabPanel>
    </Panel>
  );
}
