/** The present. Everything that asks for the time asks here, so that a test can hold it still. */
export const now = (): Date => new Date()
