import type { ActivityModel } from '../../shared/conditions';
import { Choice } from '../ui/choice';
import { Quantity } from '../ui/quantity';
import { modelWords } from './activity-models';

interface ModelChoiceProps<Model extends ActivityModel> {
  /** The models that this question can be asked with. */
  readonly models: readonly Model[];
  readonly value: Model;
  readonly onChange: (model: Model) => void;
  /** What the service said of the model. */
  readonly error?: string | undefined;
}

/** How activity coefficients are found, with the range of what is chosen. */
export function ModelChoice<Model extends ActivityModel>(props: ModelChoiceProps<Model>) {
  const { models, value, onChange, error } = props;
  return (
    <Choice
      label="Activity model"
      options={models.map((model) => ({ value: model, label: modelWords[model].name }))}
      value={value}
      onChange={onChange}
      help={<RangeWords text={modelWords[value].range} />}
      {...(error === undefined ? {} : { error })}
    />
  );
}

/** A sentence in which the sign of ionic strength is set as a quantity. */
function RangeWords({ text }: { readonly text: string }) {
  const [before, after] = text.split(/\bI\b/);
  if (after === undefined) return text;
  return (
    <>
      {before}
      <Quantity of="ionicStrength" />
      {after}
    </>
  );
}
