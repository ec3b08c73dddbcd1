import { resolve } from 'node:path'
import vue from '@vitejs/plugin-vue'
import { defineConfig } from 'electron-vite'

const at = (path: string): string => resolve(import.meta.dirname, path)

export default defineConfig({
  main: {
    build: {
      // Older than electron-vite's own choice: the command line and the browser host run in plain Node.
      target: 'node20.19',
      // Unminified output names the folder it was built in.
      minify: true,
      rollupOptions: {
        input: {
          desktop: at('src-main/hosts/desktop/desktop.ts'),
          browserHost: at('src-main/hosts/browser/browserHost.ts'),
          commandLine: at('src-main/hosts/command-line/commandLine.ts'),
        },
        output: {
          banner: ({ name, isEntry }) => (isEntry && name === 'commandLine' ? '#!/usr/bin/env node' : ''),
        },
      },
    },
  },
  preload: {
    build: {
      minify: true,
      rollupOptions: {
        input: { preload: at('src-main/hosts/desktop/preload/preload.ts') },
        output: { format: 'cjs', entryFileNames: '[name].cjs' },
      },
    },
  },
  renderer: {
    root: at('src-renderer'),
    plugins: [vue()],
    build: {
      // The page's policy allows its own files only, so nothing is put into addresses.
      assetsInlineLimit: 0,
      minify: true,
      rollupOptions: { input: at('src-renderer/index.html') },
    },
  },
})
