import { defaultSetup, type Disk } from "@/render/scene/setup";
import { iscoRadius } from "@/render/spacetime/orbits";
import { Field } from "../field/field";
import { SelectField } from "../field/select-field";
import { Column } from "./column";
import type { Slip } from "./use-slip";

const senses = [
  { value: "prograde", word: "turns with the hole" },
  { value: "retrograde", word: "turns against it" },
  { value: "none", word: "no disk" },
] as const;

export function DiskColumn({ slip }: { slip: Slip }) {
  const { form, values, readOnly } = slip;
  const { disk } = values;
  const choose = (value: string) => {
    const sense: Disk["sense"] | null = value === "prograde" || value === "retrograde" ? value : null;
    const next: Disk | null = sense && { ...(disk ?? (defaultSetup.disk as Disk)), sense };
    form.setValue("disk", next, { shouldDirty: true });
  };
  return (
    <Column title="Disk">
      <SelectField
        label="disk"
        disabled={readOnly}
        value={disk?.sense ?? "none"}
        onChange={(event) => choose(event.target.value)}
      >
        {senses.map(({ value, word }) => (
          <option key={value} value={value}>
            {word}
          </option>
        ))}
      </SelectField>
      {disk && <DiskFields slip={slip} disk={disk} />}
    </Column>
  );
}

function DiskFields({ slip, disk }: { slip: Slip; disk: Disk }) {
  const { figure, form, values, consequences, readOnly } = slip;
  const stable = disk.innerEdge === "isco";
  const choose = (where: string) => {
    // Just outside, so that rounding the figure cannot put it inside.
    const radius = Math.ceil(iscoRadius(values.hole.spin, disk.sense) * 1000) / 1000;
    form.setValue("disk.innerEdge", where === "isco" ? "isco" : radius, { shouldDirty: true });
  };
  return (
    <>
      <SelectField
        label="begins"
        disabled={readOnly}
        value={stable ? "isco" : "radius"}
        consequence={stable ? consequences.innerEdge : undefined}
        onChange={(event) => choose(event.target.value)}
      >
        <option value="isco">innermost stable</option>
        <option value="radius">at a radius</option>
      </SelectField>
      {!stable && (
        <Field
          label="inner edge"
          unit="M"
          consequence={consequences.innerEdge}
          {...figure("disk.innerEdge")}
        />
      )}
      <Field label="outer edge" unit="M" consequence={consequences.outerEdge} {...figure("disk.outerEdge")} />
      <Field
        label="peak temperature"
        unit="K"
        consequence={consequences.peakTemperature}
        {...figure("disk.peakTemperatureK")}
      />
      <Field
        label="accretion"
        unit="M☉ a year"
        computed
        value={consequences.accretion}
        consequence={consequences.eddington}
      />
    </>
  );
}
