/** Ports on this machine's loopback. Plain Node, no packages. */
import net from 'node:net';

function canListen(port, host) {
	return new Promise((resolve) => {
		const server = net.createServer();
		// A host that this machine lacks (no IPv6, say) holds nothing.
		server.once('error', (error) =>
			resolve(error.code !== 'EADDRINUSE' && error.code !== 'EACCES')
		);
		server.listen({ port, host, exclusive: true }, () => server.close(() => resolve(true)));
	});
}

/** Whether nothing listens there, on either loopback address: `localhost` may mean both. */
export async function isFree(port) {
	return (await canListen(port, '127.0.0.1')) && (await canListen(port, '::1'));
}
