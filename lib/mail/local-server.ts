// node --import tsx lib/mail/local-server.ts: the local mail server as a process, on SMTP_URL's port, into MAIL_DIR.
import { environment } from "../environment";
import { openLocalPost } from "./local-post";

const { SMTP_URL, MAIL_DIR } = environment();
if (!SMTP_URL) {
  process.stderr.write("SMTP_URL is not set: say on which port of 127.0.0.1 to take mail.\n");
  process.exit(1);
}

const post = await openLocalPost(Number(new URL(SMTP_URL).port), MAIL_DIR);
for (const signal of ["SIGINT", "SIGTERM"] as const)
  process.once(signal, () => void post.close().then(() => process.exit(0)));
