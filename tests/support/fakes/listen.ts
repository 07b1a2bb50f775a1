import { once } from 'node:events';
import type { Server } from 'node:http';

export interface Listening {
	/** `http://host:port`, without a slash at its end. */
	url: string;
	port: number;
	close(): Promise<void>;
}

/** Starts a server on a port (0 takes a free one); closing it also ends connections that are kept open. */
export async function listenOn(
	server: Server,
	{ port, host = '127.0.0.1' }: { port: number; host?: string }
): Promise<Listening> {
	server.listen(port, host);
	await once(server, 'listening');
	const address = server.address();
	if (address === null || typeof address === 'string') throw new Error('The server has no port.');
	return {
		url: `http://${host}:${address.port}`,
		port: address.port,
		close: () =>
			new Promise((resolve) => {
				server.close(() => resolve());
				server.closeAllConnections();
			})
	};
}
