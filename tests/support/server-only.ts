/** Stands for the `server-only` package in tests: there it would throw on import. */
export {}
