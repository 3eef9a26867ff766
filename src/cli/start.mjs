// npm start: makes itself ready, builds the page, serves it, prints the address and opens it. One process, so that
// ending it ends the server.
import './ready.mjs';

const { build, preview } = await import('vite');
await build({ logLevel: 'warn' });
const server = await preview({ preview: { open: true } });
server.printUrls();
