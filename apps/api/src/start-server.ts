import { createServer } from 'node:http';
import { buildApp } from './build-app.js';
import { readConfiguration } from './configuration.js';
import { openTools } from './open-tools.js';

const configuration = readConfiguration();
const { tools, close } = await openTools(configuration);
const longestUploadMs = 60 * 60_000;
const longestStopMs = 25_000;

const server = createServer({ headersTimeout: 15_000, requestTimeout: longestUploadMs, connectionsCheckingInterval: 2000, keepAliveTimeout: 10_000 }, buildApp(tools));
server.on('error', (fault: NodeJS.ErrnoException) => {
  process.stderr.write(fault.code === 'EADDRINUSE' ? `Port ${configuration.port} is taken by another program. Choose another with PORT=….\n` : `${fault.message}\n`);
  process.exit(1);
});
server.listen(configuration.port, '127.0.0.1', () => {
  const address = server.address();
  tools.log.info({ port: typeof address === 'object' && address !== null ? address.port : configuration.port }, 'api listens');
  process.send?.({ port: typeof address === 'object' && address !== null ? address.port : configuration.port });
});

let isStopping = false;
function stop(): void {
  if (isStopping) return;
  isStopping = true;
  const finish = (): void => void close().finally(() => process.exit(0));
  server.close(finish);
  server.closeIdleConnections();
  setTimeout(() => {
    server.closeAllConnections();
    finish();
  }, longestStopMs).unref();
}
process.on('SIGTERM', stop);
process.on('SIGINT', stop);
