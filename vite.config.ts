import { fileURLToPath } from 'node:url';
import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vite';

function installed(path: string): string {
  return fileURLToPath(new URL(`./node_modules/${path}`, import.meta.url));
}

// The router's package names its development build to every bundler; what readers load takes the other one.
const routerForReaders = [
  { find: /^react-router$/, replacement: installed('react-router/dist/production/index.mjs') },
  { find: /^react-router\/dom$/, replacement: installed('react-router/dist/production/dom-export.mjs') },
];

export default defineConfig(({ command, isSsrBuild }) => ({
  plugins: [react(), tailwindcss()],
  publicDir: false,
  resolve: { alias: command === 'build' && isSsrBuild !== true ? routerForReaders : [] },
}));
