import net from 'node:net';

const LOOPBACKS = ['127.0.0.1', '::1'];
const TRIES = 200;

/** The first port from `first` on that nobody listens on, on either loopback address. @param {number} first */
export async function nextFreePort(first) {
  for (let port = first; port < Math.min(first + TRIES, 65_536); port += 1) {
    if (await isFree(port)) return port;
  }
  throw new Error(`No free port from ${first} on.`);
}

async function isFree(port) {
  for (const host of LOOPBACKS) if (!(await canListen(host, port))) return false;
  return true;
}

function canListen(host, port) {
  return new Promise((resolve) => {
    const server = net.createServer();
    server.once('error', (error) => resolve(error.code === 'EADDRNOTAVAIL' || error.code === 'EAFNOSUPPORT'));
    server.listen({ host, port, exclusive: true }, () => server.close(() => resolve(true)));
  });
}

/** Whether something answers on 127.0.0.1. @param {number} port @returns {Promise<boolean>} */
export function answers(port) {
  return new Promise((resolve) => {
    const socket = net.connect({ host: '127.0.0.1', port, timeout: 1000 });
    const done = (result) => {
      socket.destroy();
      resolve(result);
    };
    socket.once('connect', () => done(true));
    socket.once('timeout', () => done(false));
    socket.once('error', () => done(false));
  });
}
