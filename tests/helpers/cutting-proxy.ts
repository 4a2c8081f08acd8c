import { once } from 'node:events';
import { type AddressInfo, connect, createServer, type Server, type Socket } from 'node:net';

/**
 * Stands between a client and a mail server. Armed, it lets the next mail through to the server, but when the server
 * answers that it has the mail, it calls `instead` and cuts the line: the client never hears of it.
 */
export class CuttingProxy {
  private armed: (() => void) | undefined;
  private readonly server: Server;
  private readonly sockets = new Set<Socket>();

  constructor(private readonly targetPort: number) {
    this.server = createServer((client) => this.join(client));
  }

  async listen(): Promise<number> {
    this.server.listen(0, '127.0.0.1');
    await once(this.server, 'listening');
    return (this.server.address() as AddressInfo).port;
  }

  /** Resolves when the answer to the next mail has been cut. */
  cutNext(instead: () => void): Promise<void> {
    return new Promise((resolve) => {
      this.armed = () => {
        instead();
        resolve();
      };
    });
  }

  close(): void {
    for (const socket of this.sockets) socket.destroy();
    this.server.close();
  }

  private join(client: Socket): void {
    const target = connect(this.targetPort, '127.0.0.1');
    let mailIsWhole = false;
    let sent = '';
    client.on('data', (data) => {
      sent = (sent + data.toString('latin1')).slice(-5);
      if (sent === '\r\n.\r\n') mailIsWhole = true;
      target.write(data);
    });
    target.on('data', (data) => {
      if (!mailIsWhole || !this.armed) return client.write(data);
      const act = this.armed;
      this.armed = undefined;
      act();
      client.destroy();
      target.destroy();
    });
    for (const [socket, other] of [
      [client, target],
      [target, client],
    ] as const) {
      this.sockets.add(socket);
      socket.on('error', () => undefined);
      socket.on('close', () => {
        this.sockets.delete(socket);
        other.destroy();
      });
    }
  }
}
