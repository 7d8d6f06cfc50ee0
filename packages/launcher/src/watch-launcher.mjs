// Loaded with --import into the servers that the launcher starts. When the launcher dies without a chance to clean
// up, its end of the channel closes, and the server ends itself as it would on SIGTERM.
if (process.channel) {
  process.on('disconnect', () => process.kill(process.pid, 'SIGTERM'));
  process.channel.unref();
}
