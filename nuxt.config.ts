import { fileURLToPath } from 'node:url'

/** Passed whole: the types of the configuration know only part of what the server build takes. */
const nitro = {
  output: process.env.TORQUILL_OUTPUT_DIR ? { dir: process.env.TORQUILL_OUTPUT_DIR } : undefined,
  alias: { 'next-auth/core': fileURLToPath(new URL('./server/access/next-auth-core.ts', import.meta.url)) },
  externals: {
    external: ['@node-rs/argon2'],
    traceInclude: [fileURLToPath(new URL('./node_modules/next-auth/core/index.js', import.meta.url))],
  },
}

export default defineNuxtConfig({
  modules: ['@nuxtjs/tailwindcss', '@pinia/nuxt', '@sidebase/nuxt-auth', 'nuxt-security', '@nuxt/eslint'],
  components: [{ path: '~/components', pathPrefix: true }],
  // Domain code is imported by path; only framework glue is automatic.
  imports: { dirs: ['composables', 'stores'] },
  devtools: { enabled: false },
  app: {
    head: {
      htmlAttrs: { lang: 'en' },
      title: 'Torquill',
      meta: [
        { name: 'viewport', content: 'width=device-width, initial-scale=1' },
        { name: 'description', content: 'Torsion substantiation notes: written, checked, released and kept true.' },
        { name: 'color-scheme', content: 'light dark' },
      ],
      link: [{ rel: 'icon', type: 'image/svg+xml', href: '/favicon.svg' }],
    },
  },
  css: ['katex/dist/katex.min.css', '~/assets/css/fonts.css', '~/assets/css/tokens.css', '~/assets/css/base.css'],
  // A build goes to a folder of its own, so that it never overwrites one that is running.
  buildDir: process.env.TORQUILL_WORK_DIR ?? '.nuxt',
  future: { compatibilityVersion: 4 },
  experimental: { payloadExtraction: false },
  compatibilityDate: '2026-01-01',
  nitro,
  vite: {
    build: { assetsInlineLimit: 0 },
    resolve: { dedupe: ['prosemirror-model', 'prosemirror-state', 'prosemirror-transform', 'prosemirror-view'] },
  },
  telemetry: false,
  auth: {
    originEnvKey: 'AUTH_ORIGIN',
    baseURL: '/api/auth',
    provider: { type: 'authjs', trustHost: false, defaultProvider: 'credentials' },
    sessionRefresh: { enableOnWindowFocus: true, enablePeriodically: false },
  },
  eslint: { config: { stylistic: { indent: 2, quotes: 'single', semi: false, braceStyle: '1tbs' } } },
  security: {
    nonce: true,
    rateLimiter: false,
    corsHandler: false,
    requestSizeLimiter: false,
    xssValidator: false,
    allowedMethodsRestricter: false,
    headers: {
      crossOriginEmbedderPolicy: false,
      referrerPolicy: 'same-origin',
      contentSecurityPolicy: {
        'default-src': ['\'self\''],
        'base-uri': ['\'none\''],
        'object-src': ['\'none\''],
        'frame-ancestors': ['\'none\''],
        'form-action': ['\'self\''],
        'img-src': ['\'self\'', 'data:', 'blob:'],
        'font-src': ['\'self\''],
        'script-src': ['\'self\'', '\'nonce-{{nonce}}\'', '\'strict-dynamic\''],
        // KaTeX and the editor place glyphs with style attributes; no style element is allowed without the nonce.
        'style-src': ['\'self\'', '\'nonce-{{nonce}}\''],
        'style-src-attr': ['\'unsafe-inline\''],
        'upgrade-insecure-requests': false,
      },
    },
  },
})
