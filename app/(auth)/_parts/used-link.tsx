import { ButtonLink } from '@/components/ui/button'
import { FormSheet } from './form-sheet'

/** A link of a mail that works no more, and how to get another. */
export function UsedLink({ again, words }: { readonly again: string; readonly words: string }) {
  return (
    <FormSheet
      title="This link works no more"
      lead="It was used already, or its time is over. Links from our mails work once."
    >
      <ButtonLink look="primary" href={again}>
        {words}
      </ButtonLink>
    </FormSheet>
  )
}
