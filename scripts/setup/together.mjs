/** Does pieces of work side by side; throws the first failure once all have come to their end. */
export async function together(...works) {
  const ended = await Promise.allSettled(works.map((work) => work()))
  const failed = ended.find(({ status }) => status === 'rejected')
  if (failed) throw failed.reason
}
