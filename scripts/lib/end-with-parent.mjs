// Loaded by `node --import` into what we start: standard input is a pipe that our own process holds open. When that
// process is gone, however it went, the pipe closes and the child ends itself, so that nothing is left running.
process.stdin.resume();
process.stdin.once('end', () => process.kill(process.pid, 'SIGTERM'));
process.stdin.once('error', () => process.kill(process.pid, 'SIGTERM'));
process.stdin.unref?.();
