import { onBeforeUnmount, onMounted } from 'vue'

/** The present minute, the same on the server and at hydration, moved on in the browser. */
export function useNow() {
  const now = useState('now', () => Date.now())
  onMounted(() => {
    now.value = Date.now()
    const timer = setInterval(() => {
      now.value = Date.now()
    }, 60_000)
    onBeforeUnmount(() => clearInterval(timer))
  })
  return now
}
