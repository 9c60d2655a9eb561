/**
 * Refuses to run against anything but a throw-away database: these tests empty tables.
 * @throws {Error} when DATABASE_URL is missing or names another database
 */
export function setup(): void {
  const url = process.env.DATABASE_URL
  if (!url || !new URL(url).pathname.startsWith('/chalkfold_test')) {
    throw new Error('These tests need their own database: run them with `npm test -- integration <file>`.')
  }
}
