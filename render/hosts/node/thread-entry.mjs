// A thread does not inherit its parent's TypeScript loader: register one, then be the thread.
import { register } from "tsx/esm/api";

register();
export const { traceTile, encodeExr, encodePng } = await import("./frame-thread");
