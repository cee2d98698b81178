/** See postgres.mjs, which stays plain JavaScript because it runs before anything is installed. */
export function startCluster(options: {
  directory: string
  port?: number
  durable?: boolean
  name?: string
}): Promise<{ url: string; home: string; stop: () => Promise<void> }>
