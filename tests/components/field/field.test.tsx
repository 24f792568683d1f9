import { render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { useForm } from "react-hook-form";
import { describe, expect, it, vi } from "vitest";
import { CheckBox } from "@/components/field/check-box";
import { Choice } from "@/components/field/choice";
import { Field } from "@/components/field/field";
import { SelectField } from "@/components/field/select-field";
import { TextArea } from "@/components/field/text-area";
import { TextField } from "@/components/field/text-field";

describe("a figure field", () => {
  it("is described by its unit and by what follows from its value", () => {
    render(<Field label="radius" unit="M" defaultValue="34.0" consequence="14.1 au; clock 0.970" />);
    const field = screen.getByRole("textbox", { name: "radius" });
    expect(field).toHaveAccessibleDescription("M 14.1 au; clock 0.970");
    expect(field).not.toHaveAttribute("aria-invalid");
  });

  it("says why a value is refused in the consequence's place", () => {
    render(
      <Field label="inclination" unit="°" consequence="in the disk" error="between 0 and 180; it was 80.0" />,
    );
    const field = screen.getByRole("textbox", { name: "inclination" });
    expect(field).toBeInvalid();
    expect(field).toHaveAccessibleDescription("° between 0 and 180; it was 80.0");
    expect(screen.queryByText("in the disk")).toBeNull();
  });

  it("cannot be written when it follows from others", async () => {
    render(<Field computed label="accretion" defaultValue="0.060" />);
    const field = screen.getByRole("textbox", { name: "accretion" });
    await userEvent.type(field, "9");
    expect(field).toHaveValue("0.060");
  });

  it("names the departure its value makes, for the ear too", () => {
    render(<Field label="peak temperature" departure="a" />);
    expect(screen.getByRole("textbox", { name: "peak temperature, departure a" })).toBeInTheDocument();
  });

  it.each([
    ["rest", {}, "border-edge"],
    ["refused", { error: "no" }, "border-double"],
    ["fixed", { disabled: true }, "border-dashed"],
    ["computed", { computed: true }, "border-dotted"],
    ["a departure", { departure: "a" }, "border-ember"],
  ])("shows by its line that it is %s", (_, state, line) => {
    render(<Field label="value" {...state} />);
    expect(screen.getByRole("textbox").parentElement).toHaveClass(line);
  });
});

describe("every control", () => {
  it("works with a form's register, and hands over what was written", async () => {
    const onSubmit = vi.fn();
    function Form() {
      const { register, handleSubmit } = useForm({
        defaultValues: { radius: "30", observer: "held", mail: "", words: "", verdict: "", notes: false },
      });
      return (
        <form onSubmit={handleSubmit((values) => onSubmit(values))}>
          <Field label="radius" {...register("radius")} />
          <SelectField label="worldline" {...register("observer")}>
            <option value="held">held</option>
            <option value="falling">falling</option>
          </SelectField>
          <TextField label="E-mail" {...register("mail")} />
          <TextArea label="Words" {...register("words")} />
          <Choice
            legend="I declare"
            options={[
              { value: "signed off", word: "signed off." },
              { value: "returned", word: "returned." },
            ]}
            {...register("verdict")}
          />
          <CheckBox label="notes" {...register("notes")} />
          <button>send</button>
        </form>
      );
    }
    render(<Form />);
    const user = userEvent.setup();
    await user.clear(screen.getByLabelText("radius"));
    await user.type(screen.getByLabelText("radius"), "34.5");
    await user.selectOptions(screen.getByLabelText("worldline"), "falling");
    await user.type(screen.getByLabelText("E-mail"), "wen@ringwright.example");
    await user.type(screen.getByLabelText("Words"), "As it should be.");
    await user.click(screen.getByRole("radio", { name: "returned." }));
    await user.click(screen.getByRole("checkbox", { name: "notes" }));
    await user.click(screen.getByRole("button", { name: "send" }));
    expect(onSubmit).toHaveBeenCalledWith({
      radius: "34.5",
      observer: "falling",
      mail: "wen@ringwright.example",
      words: "As it should be.",
      verdict: "returned",
      notes: true,
    });
  });

  it("gives its reason as its description when it is refused", () => {
    render(
      <>
        <TextField label="Password" error="At least twelve characters." />
        <TextArea label="Words" error="Say why." />
        <SelectField label="worldline" error="Not inside the ergosphere." />
      </>,
    );
    expect(screen.getByLabelText("Password")).toHaveAccessibleDescription("At least twelve characters.");
    expect(screen.getByLabelText("Words")).toHaveAccessibleDescription("Say why.");
    expect(screen.getByLabelText("worldline")).toHaveAccessibleDescription("Not inside the ergosphere.");
  });

  it("names a group of choices, says why one is missing, and keeps a closed one closed", () => {
    render(
      <Choice
        legend="On these frames I declare"
        error="Choose one."
        value="returned"
        onChange={() => undefined}
        options={[
          { value: "signed off", word: "signed off.", meaning: "They may be delivered.", disabled: true },
          { value: "returned", word: "returned." },
        ]}
      />,
    );
    expect(screen.getByRole("group", { name: "On these frames I declare" })).toHaveAccessibleDescription(
      "Choose one.",
    );
    expect(screen.getByRole("radio", { name: "signed off. They may be delivered." })).toBeDisabled();
    expect(screen.getByRole("radio", { name: "returned." })).toBeChecked();
  });
});
