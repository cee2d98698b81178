// Loaded first into every server we start. When the starter is gone, even by kill -9, the channel closes:
// then the server ends in its ordinary way instead of living on unseen.
process.once('disconnect', () => process.kill(process.pid, 'SIGTERM'))
process.channel?.unref()
