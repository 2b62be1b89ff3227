import type { SignalName } from '../../compile/index.ts';
import { plainName } from '../../expression/index.ts';
import { MathName } from '../figures/index.ts';

/** Which input and which output, as positions in the model's lists. */
export interface Channel {
  readonly input: number;
  readonly output: number;
}

interface ChannelPickerProps {
  readonly inputs: readonly SignalName[];
  readonly outputs: readonly SignalName[];
  readonly channel: Channel;
  readonly onPick: (channel: Channel) => void;
}

/** From which input to which output; plain words where there is no choice. */
export function ChannelPicker({ inputs, outputs, channel, onPick }: ChannelPickerProps) {
  return (
    <fieldset className="channel-picker" aria-label="Input and output">
      <SignalChoice
        label="Input"
        signals={inputs}
        index={channel.input}
        onPick={input => onPick({ ...channel, input })}
      />
      <span className="channel-picker-arrow" aria-hidden="true">
        →
      </span>
      <SignalChoice
        label="Output"
        signals={outputs}
        index={channel.output}
        onPick={output => onPick({ ...channel, output })}
      />
    </fieldset>
  );
}

interface SignalChoiceProps {
  readonly label: string;
  readonly signals: readonly SignalName[];
  readonly index: number;
  readonly onPick: (index: number) => void;
}

function SignalChoice({ label, signals, index, onPick }: SignalChoiceProps) {
  const [only] = signals;
  if (only === undefined) return <span className="channel-picker-none">no {label.toLowerCase()}</span>;
  if (signals.length === 1) return <MathName name={only.name} />;
  return (
    <select
      className="channel-picker-select"
      aria-label={label}
      value={index}
      onChange={event => onPick(Number(event.target.value))}
    >
      {signals.map(({ name }, position) => (
        <option key={name} value={position}>
          {plainName(name)}
        </option>
      ))}
    </select>
  );
}
