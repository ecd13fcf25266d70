import { defineStore } from 'pinia'
import { computed, ref } from 'vue'
import type { PersonDto } from '../../shared/contracts/session.ts'
import { queryClient } from '../api/query-client.ts'
import { quoteLink } from '../api/quote-link.ts'
import * as api from '../api/session.ts'

/** Who is signed in, as the server last said. */
export const useSessionStore = defineStore('session', () => {
  const person = ref<PersonDto | null>(null)
  const demo = ref(false)
  const taxRegions = ref<string[]>([])
  const role = computed(() => person.value?.role ?? null)
  let asked: Promise<void> | undefined

  function take(answer: Awaited<ReturnType<typeof api.readSession>>): void {
    person.value = answer.person
    demo.value = answer.demo
    taxRegions.value = answer.taxRegions
  }

  /** Asks once; a guard may wait for it on every way in. */
  function ready(): Promise<void> {
    asked ??= api.readSession().then(
      (answer) => {
        take(answer)
      },
      () => {
        asked = undefined
      },
    )
    return asked
  }

  async function signIn(email: string, password: string): Promise<void> {
    const answer = await api.signIn({ email, password })
    quoteLink.forget()
    queryClient.clear()
    take(answer)
  }

  async function signOut(): Promise<void> {
    await api.signOut()
    person.value = null
    queryClient.clear()
  }

  return { person, demo, taxRegions, role, ready, signIn, signOut }
})
