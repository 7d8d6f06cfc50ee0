// Loaded with --import into the servers that the launcher starts, always with a channel to it. When the launcher
// dies without a chance to clean up, the channel closes, and the server ends itself as it would on SIGTERM.
const endOurselves = () => process.kill(process.pid, 'SIGTERM');

process.on('disconnect', endOurselves);
process.channel?.unref();
// The launcher may have died before this was loaded.
if (!process.connected) endOurselves();
