/** Ports of this machine: which are free, and the one the application answers on. */
import { createServer } from 'node:net';
import { Fault } from './fault.mjs';

/** A port of the loopback address that was free a moment ago. */
export function freeLoopbackPort() {
  return new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once('error', reject);
    probe.listen(0, '127.0.0.1', () => {
      const { port } = probe.address();
      probe.close(() => resolve(port));
    });
  });
}

/** Why the port cannot be had on that address: a code such as EADDRINUSE, or undefined when it can. */
export function whyNotFree(host, port) {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once('error', (error) => resolve(error.code));
    probe.listen({ port, host, exclusive: true }, () => probe.close(() => resolve(undefined)));
  });
}

/**
 * The port to answer on. One that was asked for and cannot be had is a Fault; unasked, the next free one after 3000 is taken and said.
 * @param {string | undefined} asked the PORT setting as given
 */
export async function choosePort(host, asked, say) {
  if (asked !== undefined && asked !== '') {
    const port = Number(asked);
    if (!/^\d+$/.test(asked) || port > 65_535) {
      throw new Fault(`PORT is "${asked}". It must be a whole number from 0 to 65535.`);
    }
    const refused = await whyTaken(host, port);
    if (refused)
      throw new Fault(`${refusal(refused, host, port)} Give another with PORT, or leave PORT out.`);
    return port === 0 ? freeLoopbackPort() : port;
  }
  const first = 3000;
  for (let port = first; port < first + 100; port += 1) {
    const refused = await whyTaken(host, port);
    if (!refused) {
      if (port !== first) say(`Port ${first} is taken by another program, so ${port} is used.`);
      return port;
    }
    if (refused !== 'EADDRINUSE') throw new Fault(`${refusal(refused, host, port)} Give another with HOST.`);
  }
  throw new Fault(`No port from ${first} to ${first + 99} is free. Give one with PORT.`);
}

/** A program on [::1] alone would still answer in our place to whoever asks for "localhost", so both are tried. */
async function whyTaken(host, port) {
  const refused = await whyNotFree(host, port);
  if (refused || host !== '127.0.0.1') return refused;
  return (await whyNotFree('::1', port)) === 'EADDRINUSE' ? 'EADDRINUSE' : undefined;
}

function refusal(code, host, port) {
  switch (code) {
    case 'EADDRINUSE':
      return `Port ${port} is taken by another program.`;
    case 'EACCES':
      return `This user may not answer on port ${port}.`;
    case 'EADDRNOTAVAIL':
    case 'ENOTFOUND':
    case 'EAI_AGAIN':
      return `HOST is "${host}", which is no address of this machine.`;
    default:
      return `Port ${port} on ${host} cannot be had (${code}).`;
  }
}
