export function startCluster(options: {
  directory: string
  port: number
  durable?: boolean
}): Promise<{ url: string; stop: () => Promise<void> }>
