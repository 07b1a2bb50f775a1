/** Preloaded into the demo's children: should the demo itself be killed, they close as if they had been asked to. */
import process from 'node:process';

if (process.channel) {
	process.channel.unref();
	process.once('disconnect', () => process.kill(process.pid, 'SIGTERM'));
}
