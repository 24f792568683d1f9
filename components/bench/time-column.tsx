import { frameRates } from "@/render/scene/setup";
import { Field } from "../field/field";
import { SelectField } from "../field/select-field";
import { Column } from "./column";
import { sayRate } from "./consequences";
import type { Slip } from "./use-slip";

const nameOf = (numerator: number, denominator: number) => `${numerator}/${denominator}`;

export function TimeColumn({ slip: { figure, form, values, consequences, readOnly } }: { slip: Slip }) {
  const { rate } = values.time;
  const choose = (name: string) => {
    const [numerator = 24, denominator = 1] = name.split("/").map(Number);
    form.setValue("time.rate", { numerator, denominator }, { shouldDirty: true });
  };
  return (
    <Column title="Time">
      <Field label="first frame" consequence={consequences.frames} {...figure("time.first")} />
      <Field label="last frame" consequence={consequences.turns} {...figure("time.last")} />
      <SelectField
        label="frames a second"
        disabled={readOnly}
        value={nameOf(rate.numerator, rate.denominator)}
        onChange={(event) => choose(event.target.value)}
      >
        {frameRates.map(([numerator, denominator]) => (
          <option key={nameOf(numerator, denominator)} value={nameOf(numerator, denominator)}>
            {sayRate({ numerator, denominator })}
          </option>
        ))}
      </SelectField>
    </Column>
  );
}
