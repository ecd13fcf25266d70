import type { RouteRecordRaw } from 'vue-router'
import type { RoleName } from '../../shared/contracts/common.ts'

declare module 'vue-router' {
  interface RouteMeta {
    title: string
    /** Who may enter; anyone when left out. A courtesy: the API refuses what is not allowed. */
    roles?: readonly RoleName[]
    /** May also be entered by a private link to a quote. */
    byLink?: true
  }
}

const EVERYONE = ['contractor', 'estimator', 'accounts', 'admin'] as const
const SHOP = ['estimator', 'accounts', 'admin'] as const
const ESTIMATING = ['estimator', 'admin'] as const
const MONEY = ['accounts', 'admin'] as const

export const routes: RouteRecordRaw[] = [
  { path: '/', component: () => import('../views/FrontView.vue'), meta: { title: 'Steel columns to order' } },
  { path: '/sign-in', component: () => import('../views/SignInView.vue'), meta: { title: 'Sign in' } },
  { path: '/q', component: () => import('../views/LinkedQuoteView.vue'), meta: { title: 'Quote' } },

  {
    path: '/requests',
    component: () => import('../views/RequestsView.vue'),
    meta: { title: 'Requests', roles: ['contractor'] },
  },
  {
    path: '/requests/new',
    component: () => import('../views/NewRequestView.vue'),
    meta: { title: 'New request', roles: ['contractor'] },
  },
  {
    path: '/requests/:id',
    component: () => import('../views/RequestView.vue'),
    props: true,
    meta: { title: 'Request', roles: EVERYONE },
  },
  {
    path: '/requests/:id/edit',
    component: () => import('../views/NewRequestView.vue'),
    props: true,
    meta: { title: 'Change a draft', roles: ['contractor'] },
  },
  {
    path: '/quotes/:id',
    component: () => import('../views/QuoteView.vue'),
    props: true,
    meta: { title: 'Quote', roles: EVERYONE },
  },
  {
    path: '/orders',
    component: () => import('../views/OrdersView.vue'),
    meta: { title: 'Orders', roles: EVERYONE },
  },
  {
    path: '/orders/:id',
    component: () => import('../views/OrderView.vue'),
    props: true,
    meta: { title: 'Order', roles: EVERYONE, byLink: true },
  },

  {
    path: '/desk',
    component: () => import('../views/DeskView.vue'),
    meta: { title: 'Desk', roles: ESTIMATING },
  },
  {
    path: '/bench/:id',
    component: () => import('../views/QuoteBenchView.vue'),
    props: true,
    meta: { title: 'Quote bench', roles: ESTIMATING },
  },
  {
    path: '/accounts',
    component: () => import('../views/AccountsView.vue'),
    meta: { title: 'Accounts', roles: MONEY },
  },
  {
    path: '/ledger',
    component: () => import('../views/LedgerView.vue'),
    meta: { title: 'Ledger', roles: MONEY },
  },
  {
    path: '/people',
    component: () => import('../views/PeopleView.vue'),
    meta: { title: 'People', roles: ['admin'] },
  },
  {
    path: '/price-book',
    component: () => import('../views/PriceBookView.vue'),
    meta: { title: 'Price book', roles: ESTIMATING },
  },
  {
    path: '/audit',
    component: () => import('../views/AuditView.vue'),
    meta: { title: 'Audit', roles: ['admin'] },
  },
  {
    path: '/sections',
    component: () => import('../views/SectionsView.vue'),
    meta: { title: 'Sections', roles: SHOP },
  },
  {
    path: '/:rest(.*)*',
    component: () => import('../views/NotFoundView.vue'),
    meta: { title: 'Not found' },
  },
]
