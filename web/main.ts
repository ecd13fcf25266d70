import { VueQueryPlugin } from '@tanstack/vue-query'
import { createPinia } from 'pinia'
import { createApp } from 'vue'
import 'element-plus/dist/index.css'
import './styles/fonts.css'
import './styles/tokens.css'
import './styles/base.css'
import './styles/element-plus.css'
import './styles/element-controls.css'
import './styles/element-floats.css'
import App from './App.vue'
import { queryClient } from './api/query-client.ts'
import { router } from './router/router.ts'

// A chunk that a deploy has replaced: load the page anew, once, rather than fail on it.
window.addEventListener('vite:preloadError', (event) => {
  const last = Number(sessionStorage.getItem('reloaded-at') ?? 0)
  if (Date.now() - last < 10_000) return
  sessionStorage.setItem('reloaded-at', String(Date.now()))
  event.preventDefault()
  window.location.reload()
})

createApp(App).use(createPinia()).use(VueQueryPlugin, { queryClient }).use(router).mount('#app')
