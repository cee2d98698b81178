const oldest = [20, 19]

/** True where `version` ("20.20.2") is at least the oldest we run on. Old syntax on purpose: an old Node must be able to read it. */
export function isRecent(version) {
  const parts = version.split('.').map(Number)
  return parts[0] > oldest[0] || (parts[0] === oldest[0] && parts[1] >= oldest[1])
}

/** Ends the process with one sentence where this Node is too old. */
export function mustBeRecent(version) {
  const running = version || process.versions.node
  if (isRecent(running)) return
  console.error('Turnrow needs Node ' + oldest.join('.') + ' or newer; this is Node ' + running + '.')
  process.exit(1)
}
