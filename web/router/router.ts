import { createRouter, createWebHistory } from 'vue-router'
import { quoteLink } from '../api/quote-link.ts'
import { useSessionStore } from '../stores/session.ts'
import { homeOf } from './places.ts'
import { routes } from './routes.ts'

export const router = createRouter({
  history: createWebHistory(),
  routes,
  scrollBehavior: (to, from, saved) => saved ?? (to.path === from.path ? undefined : { top: 0 }),
})

/** Guards are manners: they spare a person a page that the API would leave empty. */
router.beforeEach(async (to) => {
  const session = useSessionStore()
  await session.ready()
  const { roles, byLink } = to.meta
  if (!roles || (byLink && !session.role && quoteLink.read())) return true
  if (!session.role) return { path: '/sign-in', query: { next: to.fullPath } }
  return roles.includes(session.role) || { path: homeOf(session.role) }
})

router.afterEach((to) => {
  document.title = `${to.meta.title} – Plumbrule`
})
