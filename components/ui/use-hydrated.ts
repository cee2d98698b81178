'use client'

import { useSyncExternalStore } from 'react'

const never = () => () => undefined

/** False as the server drew it and without JavaScript, true once this page answers. */
export const useHydrated = () =>
  useSyncExternalStore(
    never,
    () => true,
    () => false,
  )
