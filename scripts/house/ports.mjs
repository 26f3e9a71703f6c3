import { createServer } from 'node:net';
import { Fault } from './fault.mjs';

/** Whether a port can be listened on; 0 asks the system for one. Resolves with the port, or undefined. */
function tryPort(port, host) {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', (error) => {
      if (error.code === 'EADDRINUSE') resolve(undefined);
      else if (error.code === 'EACCES')
        reject(new Fault(`Port ${port} is reserved for the administrator: set PORT to one from 1024.`));
      else reject(error);
    });
    server.listen({ port, host, exclusive: true }, () => {
      const taken = server.address().port;
      server.close(() => resolve(taken));
    });
  });
}

/** The server's port, or one sentence when it is in use or no port at all. */
export async function serverPort(text) {
  const port = Number(text);
  if (!Number.isInteger(port) || port < 0 || port > 65535) {
    throw new Fault(`PORT is "${text}": set it to a whole number from 1 to 65535.`);
  }
  const free = await tryPort(port);
  if (free === undefined)
    throw new Fault(`Port ${port} is in use: stop what uses it, or set PORT to another.`);
  return free;
}

/** A port on the loopback address: the usual one if it is free, else any. A port asked for by name must be free. */
export async function localPort(asked, usual, name) {
  if (asked !== undefined) {
    const free = await tryPort(Number(asked), '127.0.0.1');
    if (free === undefined) throw new Fault(`Port ${asked} is in use: set ${name} to another.`);
    return free;
  }
  return (await tryPort(usual, '127.0.0.1')) ?? tryPort(0, '127.0.0.1');
}
