import { Field } from "../field/field";
import { SelectField } from "../field/select-field";
import { Column } from "./column";
import type { Slip } from "./use-slip";

export function PictureColumn({ slip: { figure, consequences } }: { slip: Slip }) {
  return (
    <Column title="Picture">
      <Field label="width" unit="pixels" {...figure("picture.width")} />
      <Field label="height" unit="pixels" consequence={consequences.format} {...figure("picture.height")} />
      <Field
        label="exposure"
        unit="stops"
        consequence={consequences.exposure}
        {...figure("picture.exposureStops")}
      />
    </Column>
  );
}

export function SkyColumn({ slip: { figure, word, values, consequences } }: { slip: Slip }) {
  return (
    <Column title="Sky">
      <SelectField label="sky" {...word("sky.kind")}>
        <option value="stars">catalogued stars</option>
        <option value="dark">dark</option>
      </SelectField>
      {values.sky.kind === "stars" && (
        <>
          <Field label="stars" unit="stops" consequence={consequences.stars} {...figure("sky.starStops")} />
          <Field label="axis, right ascension" unit="°" {...figure("sky.poleRaDeg")} />
          <Field
            label="axis, declination"
            unit="°"
            consequence="90 is the Earth’s pole star"
            {...figure("sky.poleDecDeg")}
          />
          <Field label="turn about it" unit="°" {...figure("sky.turnDeg")} />
        </>
      )}
    </Column>
  );
}
