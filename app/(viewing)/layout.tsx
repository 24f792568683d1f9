import type { ReactNode } from "react";
import { Shell } from "../shell";

export default function ViewingLayout({ children }: { children: ReactNode }) {
  return <Shell native="viewing">{children}</Shell>;
}
