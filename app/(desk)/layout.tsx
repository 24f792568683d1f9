import type { ReactNode } from "react";
import { SignOut } from "@/components/sign-in/sign-out";
import { Shell } from "../shell";
import { readShellActor } from "../shell-actor";

export default async function DeskLayout({ children }: { children: ReactNode }) {
  return (
    <Shell native="desk" actor={await readShellActor()} signOut={<SignOut />}>
      {children}
    </Shell>
  );
}
