/** Words of a shell that PostgreSQL reads must not leak into the demo: only these reach its programs. */
export const postgresEnvironment = () => ({ PATH: process.env.PATH, LC_ALL: "C.UTF-8", TZ: "UTC" });
