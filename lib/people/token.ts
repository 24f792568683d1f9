import { createHash, createHmac, randomUUID } from "node:crypto";
import { studioSecret } from "../auth/secret";

/**
 * The 32 bytes that open a link. They follow from the link's random id and the studio's secret, so that a letter that
 * is sent again carries the same link, and neither the links nor the letters waiting in the database hold it.
 */
export const tokenOf = (linkId: string): string =>
  createHmac("sha256", studioSecret()).update(`link ${linkId}`).digest("base64url");

export const hashToken = (token: string): string => createHash("sha256").update(token).digest("hex");

/** A new link's id and the hash by which its token will be known. */
export function newLink(): { id: string; tokenHash: string } {
  const id = randomUUID();
  return { id, tokenHash: hashToken(tokenOf(id)) };
}
