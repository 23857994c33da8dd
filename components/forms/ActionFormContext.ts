'use client'

import { createContext, useContext } from 'react'

export interface ActionFormState {
  id: string
  busy: boolean
}

export const ActionFormContext = createContext<ActionFormState>({ id: 'form', busy: false })

/** The form around a field: its id, from which field ids are made, and whether it is being sent. */
export const useActionFormState = () => useContext(ActionFormContext)
