import type { Metadata } from "next";
import { AskResetForm } from "@/components/sign-in/ask-reset-form";
import { Threshold } from "@/components/sign-in/threshold";
import { Shell } from "../shell";

export const metadata: Metadata = { title: "A new password" };

export default function AskResetPage() {
  return (
    <Shell native="desk">
      <Threshold
        title="A new password."
        words="Write your e-mail address, and a link to set one is sent to it."
      >
        <AskResetForm />
      </Threshold>
    </Shell>
  );
}
