import { Field } from '../../../components/ui/field';
import { Input } from '../../../components/ui/input';
import type { ApiProblem } from '../../../lib/api/problem';
import { dayAndTime } from '../../../lib/format/time';
import { fromZonedInput, toZonedInput } from '../../../lib/format/zoned-input';

interface UntilFieldProps {
  /** The end as ISO 8601. */
  value: string;
  zone: string;
  problem: ApiProblem | undefined;
  onChange: (expiresAt: string) => void;
}

/** Until when a notice holds, in the district's own time; the service refuses what is beyond the rule's longest. */
export function UntilField({ value, zone, problem, onChange }: UntilFieldProps) {
  return (
    <Field
      label="Holds until"
      help={`${dayAndTime(value, zone)}. It ends by itself then, unless it is extended.`}
      error={problem?.errors[0]?.text ?? problem?.message}
    >
      <Input
        type="datetime-local"
        step={300}
        value={toZonedInput(value, zone)}
        onChange={({ target }) => {
          const instant = fromZonedInput(target.value, zone);
          if (instant) onChange(instant);
        }}
      />
    </Field>
  );
}
