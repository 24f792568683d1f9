import type { ReactNode } from "react";
import { Shell } from "../shell";

export default function DeskLayout({ children }: { children: ReactNode }) {
  return <Shell native="desk">{children}</Shell>;
}
