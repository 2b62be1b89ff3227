/** The tabs under the system matrix and the panel of the selected one. */

import { Suspense } from 'react';
import { Panel, PanelPending, TabPanel, TabStrip } from '../results/index.ts';
import { actions, type State, useStore } from '../store/index.ts';
import { Picker } from './Picker.tsx';
import { RESULT_TABS } from './result-tabs.ts';

const resultTab = (state: State) => state.view.resultTab;

export function ResponsePanel() {
  const selected = useStore(resultTab);
  const { id, title, isOfChannel, View } = RESULT_TABS.find(tab => tab.id === selected) ?? RESULT_TABS[0];
  return (
    <Panel title={title} aside={isOfChannel ? <Picker /> : undefined}>
      <TabStrip
        name="response"
        label="More of the model"
        tabs={RESULT_TABS}
        selected={id}
        onSelect={actions.openResultTab}
      />
      <TabPanel name="response" id={id}>
        <Suspense fallback={<PanelPending label={title} />}>
          <View />
        </Suspense>
      </TabPanel>
    </Panel>
  );
}
