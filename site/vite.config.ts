import { fileURLToPath } from 'node:url'
import mdx from '@mdx-js/rollup'
import react from '@vitejs/plugin-react'
import rehypeKatex from 'rehype-katex'
import remarkFrontmatter from 'remark-frontmatter'
import remarkGfm from 'remark-gfm'
import remarkMath from 'remark-math'
import remarkMdxFrontmatter from 'remark-mdx-frontmatter'
import { defineConfig } from 'vite'
import { calculatorIndex } from './scripts/calculator-index.ts'
import { lessonIndex } from './scripts/lesson-index.ts'
import { rehypeBareMath } from './src/mdx/rehype-bare-math.ts'
import { remarkContents } from './src/mdx/remark-contents.ts'

const folder = (path: string) => fileURLToPath(new URL(path, import.meta.url))
const server = { target: 'http://localhost:4310', changeOrigin: false }

/** `content/<course>/<nn>-<lesson>.mdx` → `lessons/<course>/<lesson>`: the address that the server guards. */
function lessonChunk(module: string | null) {
  const [, course, lesson] = module?.match(/\/content\/([a-z-]+)\/\d+-([a-z-]+)\.mdx$/) ?? []
  return lesson && `lessons/${course}/${lesson}-[hash].js`
}

/** What every calculator needs and no page before its first paint: units, checking, printing. Each calculator is a chunk of its own. */
const isCalculation = (module: string) =>
  module.includes('/node_modules/mathjs/') ||
  [folder('../calc/units/'), folder('../calc/numeric/')].some((part) => module.startsWith(part)) ||
  (module.startsWith(folder('../calc/')) && !module.slice(folder('../calc/').length).includes('/'))

export default defineConfig(({ isSsrBuild }) => ({
  plugins: [
    calculatorIndex(folder('../calc')),
    lessonIndex(folder('../content')),
    {
      enforce: 'pre',
      ...mdx({
        include: [/\/content\/.*\.mdx$/],
        remarkPlugins: [remarkFrontmatter, remarkContents, remarkMdxFrontmatter, remarkGfm, remarkMath],
        // As MathML alone: the browser sets it, screen readers read it, and it weighs a third of KaTeX's own boxes.
        rehypePlugins: [[rehypeKatex, { output: 'mathml' }], rehypeBareMath],
      }),
    },
    react(),
  ],
  build: {
    outDir: folder(isSsrBuild ? '../dist/site-server' : '../dist/site'),
    emptyOutDir: true,
    copyPublicDir: !isSsrBuild,
    sourcemap: true,
    // Fonts come from files: the content security policy knows no data: fonts.
    assetsInlineLimit: 0,
    // One style sheet: a page rendered at build time then needs no list of its lazy parts' styles.
    cssCodeSplit: false,
    rolldownOptions: {
      input: folder(isSsrBuild ? 'src/entry-server.tsx' : 'index.html'),
      output: isSsrBuild
        ? { entryFileNames: 'entry-server.js' }
        : {
            chunkFileNames: (chunk) => lessonChunk(chunk.facadeModuleId) ?? 'assets/[name]-[hash].js',
            codeSplitting: { groups: [{ name: 'calculation', test: isCalculation }] },
          },
    },
  },
  // The worker loads the one calculator that it draws for.
  worker: { format: 'es', plugins: () => [calculatorIndex(folder('../calc'))] },
  // Bundled, so that the build-time rendering resolves every package as the browser's bundle does.
  ssr: { noExternal: true },
  server: { fs: { allow: [folder('..')] }, proxy: { '/api': server, '/lessons': server } },
  preview: { proxy: { '/api': server } },
}))
