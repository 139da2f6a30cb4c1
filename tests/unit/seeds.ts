import fc from 'fast-check'

// One seed for all property tests: a failure repeats, and a change is judged by itself. TORQUILL_SEED tries another.
fc.configureGlobal({ seed: Number(process.env.TORQUILL_SEED ?? 20_261_012) })
