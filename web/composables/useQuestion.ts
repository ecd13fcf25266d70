import { ElMessageBox } from 'element-plus/es/components/message-box/index.mjs'

/** Asks before what cannot be taken back; true when the person says yes. */
export function askFirst(title: string, meaning: string, yes: string, no = 'No'): Promise<boolean> {
  return ElMessageBox.confirm(meaning, title, {
    confirmButtonText: yes,
    cancelButtonText: no,
  }).then(
    () => true,
    () => false,
  )
}
