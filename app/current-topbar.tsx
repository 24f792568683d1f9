"use client";

import { usePathname } from "next/navigation";
import { Topbar, type TopbarProps } from "@/components/topbar/topbar";
import { currentScreen } from "./current-screen";

type CurrentTopbarProps = Omit<TopbarProps, "items"> & { items: { href: string; label: string }[] };

/** The bar with the bracket under the screen that the address belongs to. */
export function CurrentTopbar({ items, ...rest }: CurrentTopbarProps) {
  const current = currentScreen(usePathname(), items);
  return <Topbar items={items.map((item) => ({ ...item, current: item.href === current }))} {...rest} />;
}
