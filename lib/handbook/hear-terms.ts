export async function hearTermsInEpisode({ episodeId }: { episodeId: string }): Promise<void> {
  throw new Error(`the handbook engineer writes this: ${episodeId}`)
}
