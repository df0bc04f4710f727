/** Vite with the API behind it, both reloading: the site on PORT, the API on PORT + 10. */
import { spawn } from 'node:child_process';
import path from 'node:path';

const root = path.resolve(import.meta.dirname, '../..');
const port = Number(process.env['PORT'] ?? '4600');
const apiPort = port + 10;
const bin = (name: string) => path.join(root, 'node_modules', name);

const children = [
  spawn(
    process.execPath,
    [bin('tsx/dist/cli.mjs'), 'watch', '--clear-screen=false', 'api/cli/serve-api.ts'],
    {
      cwd: root,
      stdio: 'inherit',
      env: { ...process.env, PORT: String(apiPort), PUBLIC_URL: `http://localhost:${String(port)}` },
    },
  ),
  spawn(process.execPath, [bin('vite/bin/vite.js')], {
    cwd: root,
    stdio: 'inherit',
    env: { ...process.env, PORT: String(port), API_PORT: String(apiPort) },
  }),
];

const stop = () => {
  for (const child of children) child.kill('SIGTERM');
};
process.once('SIGINT', stop);
process.once('SIGTERM', stop);
for (const child of children) child.once('exit', stop);
