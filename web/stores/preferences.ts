import { useLocalStorage } from '@vueuse/core'
import { defineStore } from 'pinia'
import { watchEffect } from 'vue'
import type { UnitSystem } from '../../shared/units/step.ts'

export type Theme = 'system' | 'light' | 'dark'

/** How this person likes to see things, kept in this browser. Units never change what is stored. */
export const usePreferencesStore = defineStore('preferences', () => {
  const units = useLocalStorage<UnitSystem>('units', 'SI')
  const theme = useLocalStorage<Theme>('theme', 'system')

  watchEffect(() => {
    const { dataset } = document.documentElement
    if (theme.value === 'system') delete dataset.theme
    else dataset.theme = theme.value
  })

  return { units, theme }
})
