// Loaded first into every server we start. When the starter is gone, even by kill -9, the channel closes:
// then the server ends in its ordinary way instead of living on unseen.
// A process that such a server forks inherits this file; its channel leads to the server and is the server's own matter
// (the development server's child has nothing else that keeps it alive at first).
if (process.ppid === Number(process.env.TURNROW_STARTER)) {
  process.once('disconnect', () => process.kill(process.pid, 'SIGTERM'))
  process.channel?.unref()
}
