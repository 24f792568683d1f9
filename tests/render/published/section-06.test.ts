// Section 6: whole light paths, each ray within tolerance × max(1, condition) (closed forms to 40 digits).
import { describe, expect, it } from "vitest";
import { tracePath } from "@/render/paths/tracer";
import { checksOf, entriesOf, expectAgreement, numberIn, type Entry } from "./entries";

const sign = (entry: Entry, name: string) => (numberIn(entry, name) < 0 ? -1 : 1);

const startOf = (entry: Entry) => ({
  spin: numberIn(entry, "a"),
  rObs: numberIn(entry, "r_obs"),
  cosThetaObs: numberIn(entry, "cos_theta_obs"),
  lambda: numberIn(entry, "lambda"),
  eta: numberIn(entry, "eta"),
  signPr: sign(entry, "sign_pr_at_observer") as 1 | -1,
  signPtheta: sign(entry, "sign_ptheta_at_observer") as 1 | -1,
});

/** The direction at infinity has a condition of its own, `condition_inf`; it is checked first, then carried over. */
function trace(entry: Entry) {
  const path = tracePath(startOf(entry));
  const given = entry.expected as Record<string, number>;
  const carried: Record<string, number> = {};
  for (const name of ["cos_theta_inf", "theta_inf_deg", "dphi_inf", "dphi_inf_mod_2pi"] as const) {
    if (!(name in given)) continue;
    expectAgreement(entry, path[name], given[name], name, given["condition_inf"]);
    carried[name] = given[name]!;
  }
  if ("condition_inf" in given) carried["condition_inf"] = given["condition_inf"];
  return { ...path, ...carried };
}

const checks = checksOf(6, { ray: trace });

describe("published values, section 6", () => {
  it("has all its entries", () => expect(entriesOf(6)).toHaveLength(45));
  for (const { name, run } of checks) it(name, run);
});
