/**
 * Loaded before a child of `npm start`: when the parent is gone, however it went, the child ends too. Otherwise a
 * parent killed outright would leave programs behind that hold the ports.
 */
if (process.channel) {
  process.once('disconnect', () => process.kill(process.pid, 'SIGTERM'))
  process.channel.unref()
}
