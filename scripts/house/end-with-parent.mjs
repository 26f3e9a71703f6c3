/** Loaded before a program that `npm start` starts: when the starter is gone, the program ends too, in order. */
process.once('disconnect', () => process.kill(process.pid, 'SIGTERM'));
process.channel?.unref();
