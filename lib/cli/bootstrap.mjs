/**
 * What `npm start`, `npm test`, `npm run plan` and the other scripts call. It imports only `node:` modules, since
 * nothing may be installed yet, and this file keeps to syntax that an old Node.js can parse, to refuse it in words.
 */
const [major, minor] = process.versions.node.split('.').map(Number);

if (major < 20 || (major === 20 && minor < 19)) {
  console.error('Wadewell needs Node.js 20.19 or newer; this is ' + process.versions.node + '.');
  process.exitCode = 1;
} else {
  import('./bootstrap/main.mjs').then(({ run }) => run(process.argv[2], process.argv.slice(3)));
}
