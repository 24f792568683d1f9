// Runs in the browser before any page. Zod would otherwise try to make functions from text, which our content policy refuses
// and reports as a violation.
import { config } from "zod/v4/core";

config({ jitless: true });
