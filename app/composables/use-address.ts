import { computed, type WritableComputedRef } from 'vue'

/**
 * One value of a list that lives in the address, so that a view can be sent to
 * somebody and the back key works. An empty value leaves the address; a change
 * of anything but the page begins again at its first page.
 */
export function useAddress(name: string): WritableComputedRef<string> {
  const route = useRoute()
  const router = useRouter()
  return computed({
    get: () => {
      const value = route.query[name]
      return typeof value === 'string' ? value : ''
    },
    set: (value) => {
      const query = { ...route.query }
      if (value === '') Reflect.deleteProperty(query, name)
      else query[name] = value
      if (name !== 'page') Reflect.deleteProperty(query, 'page')
      void router.replace({ query })
    },
  })
}
