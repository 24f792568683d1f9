import { observerKinds, type Lens, type ObserverKind } from "@/render/scene/setup";
import { Field } from "../field/field";
import { SelectField } from "../field/select-field";
import { Column } from "./column";
import type { Slip } from "./use-slip";

const observerWords: Record<ObserverKind, string> = {
  held: "held still",
  "zero-angular-momentum": "carried round",
  "circular-orbit": "on an orbit",
  falling: "falling",
};

const lenses: Record<Lens["kind"], { word: string; first: Lens }> = {
  rectilinear: { word: "rectilinear", first: { kind: "rectilinear", horizontalFieldDeg: 50 } },
  dome: { word: "dome", first: { kind: "dome", fieldDeg: 180, tiltDeg: 0 } },
  panorama: { word: "panorama", first: { kind: "panorama" } },
};

export function CameraColumn({ slip }: { slip: Slip }) {
  const { figure, word, consequences } = slip;
  return (
    <Column title="Camera">
      <SelectField label="worldline" consequence={consequences.observer} {...word("camera.observer")}>
        {observerKinds.map((kind) => (
          <option key={kind} value={kind}>
            {observerWords[kind]}
          </option>
        ))}
      </SelectField>
      <Field label="radius" unit="M" consequence={consequences.radius} {...figure("camera.radius")} />
      <Field
        label="inclination"
        unit="°"
        consequence="0 above the pole, 90 in the disk"
        {...figure("camera.inclinationDeg")}
      />
      <Field label="yaw" unit="°" consequence="0 aims at the hole" {...figure("camera.yawDeg")} />
      <Field label="pitch" unit="°" {...figure("camera.pitchDeg")} />
      <Field
        label="roll"
        unit="°"
        consequence="0 keeps the spin axis upright"
        {...figure("camera.rollDeg")}
      />
      <LensFields slip={slip} />
    </Column>
  );
}

function LensFields({ slip: { figure, form, values, consequences, readOnly } }: { slip: Slip }) {
  const { kind } = values.camera.lens;
  const choose = (next: string) => {
    const lens = Object.entries(lenses).find(([name]) => name === next)?.[1];
    if (lens) form.setValue("camera.lens", lens.first, { shouldDirty: true });
  };
  return (
    <>
      <SelectField
        label="lens"
        disabled={readOnly}
        value={kind}
        consequence={kind === "panorama" ? "all round: twice as wide as high" : undefined}
        onChange={(event) => choose(event.target.value)}
      >
        {Object.entries(lenses).map(([name, { word }]) => (
          <option key={name} value={name}>
            {word}
          </option>
        ))}
      </SelectField>
      {kind === "rectilinear" && (
        <Field
          key="field"
          label="field of view"
          unit="°"
          consequence={consequences.field}
          {...figure("camera.lens.horizontalFieldDeg")}
        />
      )}
      {kind === "dome" && (
        <>
          <Field
            key="dome"
            label="field"
            unit="°"
            consequence="180 is a half sphere"
            {...figure("camera.lens.fieldDeg")}
          />
          <Field
            key="tilt"
            label="tilt"
            unit="°"
            consequence="of the dome’s axis, forward"
            {...figure("camera.lens.tiltDeg")}
          />
        </>
      )}
    </>
  );
}
