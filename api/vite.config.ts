import { defineConfig } from 'vite'

/** The server as one file in `dist/api/`; packages stay in node_modules. Vite, because it emits what Nest's injection reads. */
export default defineConfig({
  root: import.meta.dirname,
  build: {
    ssr: 'src/main.ts',
    outDir: '../dist/api',
    emptyOutDir: true,
    target: 'node20',
    sourcemap: true,
    minify: false,
  },
})
