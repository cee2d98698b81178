/** Settings under which service tests run; the database is added by `freshDatabase`. */
export const settingsForTests = {
  BASE_URL: 'http://localhost:3999',
  NEXTAUTH_URL: 'http://localhost:3999',
  NEXTAUTH_SECRET: 'a secret that is only good for tests, forty long',
  MEDIA_SECRET: 'another secret that is only good for tests, long',
  LOG_LEVEL: 'silent',
}
