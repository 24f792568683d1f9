// Rays as the command line takes and gives them: the field names of the published check values, section 6.
import { z } from "zod";
import { polarPotential, radialPotential } from "../../paths/motion";
import { outerHorizon } from "../../spacetime/orbits";

const finite = (low: number, high: number) =>
  z
    .number({ error: `A number from ${low} to ${high}.` })
    .min(low, `Must be from ${low} to ${high}.`)
    .max(high, `Must be from ${low} to ${high}.`);

const sign = z.union([z.literal(1), z.literal(-1)], { error: "Must be 1 or -1." });

/** Further fields, such as theta_obs_deg, are let pass: published lists carry them as remarks. */
export const raySchema = z
  .looseObject({
    id: z.union([z.string(), z.number()]).optional(),
    a: finite(0, 0.9999),
    r_obs: finite(1, 1e9),
    cos_theta_obs: finite(-1, 1),
    lambda: finite(-1e12, 1e12),
    eta: finite(-1e18, 1e18),
    sign_pr_at_observer: sign,
    sign_ptheta_at_observer: sign,
  })
  .superRefine((ray, context) => {
    const refuse = (field: string, message: string) =>
      context.addIssue({ code: "custom", path: [field], message });
    if (ray.r_obs <= outerHorizon(ray.a))
      return refuse("r_obs", `The observer is inside the horizon, ${outerHorizon(ray.a)} M at this spin.`);
    // Rounded inputs may leave a potential a few units in the last place below zero at a turning point.
    const radial = radialPotential(ray.a, ray.lambda, ray.eta, 1 / ray.r_obs);
    const polar = polarPotential(ray.a, ray.lambda, ray.eta, ray.cos_theta_obs);
    const scale = 1e-12 * (1 + Math.abs(ray.eta) + ray.lambda * ray.lambda);
    if (radial < -scale)
      refuse("eta", "No light of these constants passes this radius: R(r) is negative there.");
    if (polar < -scale)
      refuse("eta", "No light of these constants passes this latitude: Θ(θ) is negative there.");
  });

export const raysSchema = z.array(raySchema, { error: "Must be an array of rays." });
export type Ray = z.infer<typeof raySchema>;
