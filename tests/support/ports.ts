import { once } from 'node:events';
import { createServer } from 'node:net';

/** Ports that were free a moment ago, no two alike. */
export async function freePorts(count: number): Promise<number[]> {
	const servers = Array.from({ length: count }, () => createServer().listen(0, '127.0.0.1'));
	const ports: number[] = [];
	for (const server of servers) {
		if (!server.listening) await once(server, 'listening');
		const address = server.address();
		if (address === null || typeof address === 'string') throw new Error('The server has no port.');
		ports.push(address.port);
	}
	await Promise.all(servers.map((server) => new Promise((resolve) => server.close(resolve))));
	return ports;
}
