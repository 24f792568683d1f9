/**
 * @typedef {object} EnvironmentParts
 * @property {NodeJS.ProcessEnv} base what the launcher itself was given
 * @property {import("./folders.mjs").Folders} folders
 * @property {string} databaseUrl
 * @property {string} secret next-auth's
 * @property {number} webPort
 * @property {number} smtpPort
 * @property {string} [distDir] where the built web app is, relative to the repository
 */

/**
 * What web, worker, mail server and the demonstration are told. The addresses are the launcher's to say, because it
 * chose the ports; everything else given from outside (REDIS_URL, S3_BUCKET, LOG_LEVEL…) passes through.
 * @param {EnvironmentParts} parts
 * @returns {NodeJS.ProcessEnv}
 */
export function assembleEnvironment({ base, folders, databaseUrl, secret, webPort, smtpPort, distDir }) {
  return {
    ...base,
    NODE_ENV: "production",
    RINGWRIGHT_LOCAL: "1",
    DATABASE_URL: databaseUrl,
    NEXTAUTH_URL: `http://127.0.0.1:${webPort}`,
    NEXTAUTH_SECRET: base.NEXTAUTH_SECRET ?? secret,
    PORT: String(webPort),
    STORAGE_DIR: folders.storage,
    SMTP_URL: `smtp://127.0.0.1:${smtpPort}`,
    MAIL_DIR: folders.mail,
    MAIL_FROM: base.MAIL_FROM ?? "Ringwright <studio@ringwright.example>",
    DEMO_ACCOUNTS_FILE: folders.accounts,
    ...(distDir ? { NEXT_DIST_DIR: distDir } : {}),
  };
}
