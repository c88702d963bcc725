import { once } from 'node:events';
import { createServer, connect, type AddressInfo, type Server, type Socket } from 'node:net';

/** A cable to the database that a test can pull out and put back. */
export class DatabaseProxy {
  /** The database's address through the cable. */
  readonly url: string;
  private readonly target: URL;
  private readonly port: number;
  private server: Server | null = null;
  private readonly sockets = new Set<Socket>();

  private constructor(target: URL, port: number) {
    this.target = target;
    this.port = port;
    const through = new URL(target);
    through.hostname = '127.0.0.1';
    through.port = String(port);
    this.url = through.toString();
  }

  static async to(url: string): Promise<DatabaseProxy> {
    const probe = createServer().listen(0, '127.0.0.1');
    await once(probe, 'listening');
    const { port } = probe.address() as AddressInfo;
    probe.close();
    await once(probe, 'close');
    return new DatabaseProxy(new URL(url), port);
  }

  async plugIn(): Promise<void> {
    this.server = createServer((near) => {
      const far = connect(Number(this.target.port || 5432), this.target.hostname);
      for (const socket of [near, far]) {
        this.sockets.add(socket);
        socket.on('error', () => socket.destroy());
        socket.on('close', () => this.sockets.delete(socket));
      }
      near.on('close', () => far.destroy());
      far.on('close', () => near.destroy());
      near.pipe(far).pipe(near);
    });
    this.server.listen(this.port, '127.0.0.1');
    await once(this.server, 'listening');
  }

  async pullOut(): Promise<void> {
    const { server } = this;
    if (server === null) return;
    this.server = null;
    server.close();
    for (const socket of this.sockets) socket.destroy();
    await once(server, 'close');
  }
}
