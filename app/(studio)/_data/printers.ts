import { useQuery, useQueryClient } from '@tanstack/react-query'
import { v7 as newId } from 'uuid'
import type { Printer, Printers } from '@/components/print/printer-correction'
import { ask } from './api'

const path = '/api/printers'
const key = ['printers']

/** The printers that the person has measured, in any workroom; undefined until they are known. */
export function usePrinters(): Printers | undefined {
  const queries = useQueryClient()
  const list = useQuery({ queryKey: key, queryFn: () => ask<readonly Printer[]>(path) })
  if (!list.data) return undefined
  return {
    known: list.data,
    keep: async (name, { short, long }) => {
      const printer = await ask<Printer>(path, { json: { id: newId(), name: name.trim(), short, long } })
      await queries.invalidateQueries({ queryKey: key })
      return printer
    },
    forget: async (id) => {
      await ask(`${path}/${id}`, { method: 'DELETE', json: {} })
      await queries.invalidateQueries({ queryKey: key })
    },
  }
}
