import { ElOption, ElSelect } from 'element-plus/es/components/select/index.mjs'
import type { Component } from 'vue'

/* The library types these two by the declarations of their props where it means the values; as plain components they are right. */
export const SelectBox = ElSelect as Component
export const SelectOption = ElOption as Component
