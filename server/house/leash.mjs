// Loaded into the server ahead of its own code: if the house dies without a word, the server ends too.
process.once('disconnect', () => process.kill(process.pid, 'SIGTERM'));
process.channel?.unref();
