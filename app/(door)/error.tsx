"use client";

import { Fault, type FaultProps } from "../fault";

export default function ErrorPage(props: FaultProps) {
  return <Fault {...props} />;
}
