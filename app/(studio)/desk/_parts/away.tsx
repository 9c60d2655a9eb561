import { Button } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'
import type { OpenedDraft } from '../../_data/opened-drafts'

/** Says that there is no network, and which drafts open without it. */
export function Away({ drafts }: { readonly drafts: readonly OpenedDraft[] }) {
  return (
    <main className="mx-auto grid min-h-[80dvh] max-w-140 content-center gap-6 px-4 py-10">
      <EmptyState
        level={1}
        title="You are offline"
        action={
          <Button look="primary" onClick={() => window.location.reload()}>
            Try again
          </Button>
        }
      >
        <p>Chalkfold cannot be reached just now. Nothing that was on this device is lost.</p>
      </EmptyState>
      {drafts.length > 0 && (
        <section aria-labelledby="kept">
          <h2 id="kept" className="mb-2 font-semibold">
            Drafts that open without the network
          </h2>
          <ul className="border-t hairline">
            {drafts.map(({ draftId, draft, back }) => (
              <li key={draftId} className="border-b hairline">
                {/* A full load: the way through the server is not there. */}
                <a
                  href={`/drafts/${draftId}`}
                  className="flex min-h-12 flex-wrap items-center gap-x-3 px-1 py-2 hover:bg-sheet"
                >
                  <span className="font-semibold">{draft.name}</span>
                  <span className="text-sm text-walnut">{back.label}</span>
                </a>
              </li>
            ))}
          </ul>
        </section>
      )}
    </main>
  )
}
