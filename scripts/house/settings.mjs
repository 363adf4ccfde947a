/**
 * What the application is told at its start (lib/env.ts reads it). What the person set in the environment wins.
 * @param {{ secrets: { sessionSecret: string, demoPassword: string }, databaseUrl: string, mailUrl: string, address: string, given?: Readonly<Record<string, string | undefined>> }} parts
 */
export const settingsFor = ({ secrets, databaseUrl, mailUrl, address, given = process.env }) => ({
  ...given,
  DATABASE_URL: databaseUrl,
  NEXTAUTH_SECRET: given.NEXTAUTH_SECRET || secrets.sessionSecret,
  NEXTAUTH_URL: given.NEXTAUTH_URL || address,
  SMTP_URL: given.SMTP_URL || mailUrl,
  TAMIS_DEMO_PASSWORD: given.TAMIS_DEMO_PASSWORD || secrets.demoPassword,
});
