import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { SignInForm } from "@/components/sign-in/sign-in-form";
import { Threshold } from "@/components/sign-in/threshold";
import { localPath } from "@/lib/auth/local-path";
import { currentActor } from "@/lib/auth/session";
import { Shell } from "../shell";

export const metadata: Metadata = { title: "Sign in" };

export default async function SignInPage({
  searchParams,
}: {
  searchParams: Promise<{ next?: string | string[] }>;
}) {
  const next = localPath((await searchParams).next);
  if (await currentActor()) redirect(next);
  return (
    <Shell native="desk">
      <Threshold title="Sign in.">
        <SignInForm next={next} />
      </Threshold>
    </Shell>
  );
}
