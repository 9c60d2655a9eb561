import type { Metadata } from 'next'

export const metadata: Metadata = { title: 'What is stored, and cautions' }

/** Short and in plain words: what a workroom trusts us with, and what stays its own to answer for. */
export default function Legal() {
  return (
    <div className="mx-auto max-w-160 px-4 pt-6 pb-20 sm:px-8">
      <h1 className="mb-8 text-xl font-semibold tracking-tight sm:text-2xl">What is stored, and cautions</h1>
      <Part title="What is stored">
        <p>
          Of you: your name, e-mail address, a password that nobody can read back, and when you signed in. Of
          your clients: what your workroom writes down, such as names, contacts and measurements. Of your
          work: drafts with every saved version, and what you printed or shared.
        </p>
        <p>
          It is stored for your workroom alone. Other workrooms cannot reach it, and it is not sold or used to
          advertise. Two cookies are set: one keeps you signed in, one remembers daylight or lamp. There are
          no trackers.
        </p>
      </Part>
      <Part title="What a link shows">
        <p>
          A shared drawing shows the pattern, the lengths on it and the checks: never the client’s name,
          contact or measure card. A lesson also shows the sums, and from sums measurements can be worked out,
          so ask before you share one. A link can be taken back at any time.
        </p>
      </Part>
      <Part title="What stays yours">
        <p>
          Measurements are about people: keep only what you need, and follow the law on personal data where
          you work. Prices and taxes are the workroom’s own responsibility under local law.
        </p>
      </Part>
      <Part title="Take care">
        <ul className="list-disc pl-5">
          <li>Print at 100 % and measure the test squares before you cut. Make a toile before dear cloth.</li>
          <li>Shears, rotary cutters and hot irons hurt. Keep them from children.</li>
          <li>Keep loose, flared sleeves and hems away from flames and machinery.</li>
          <li>
            Cords and drawstrings on children’s clothes are regulated: follow the standard in force where the
            garment is sold.
          </li>
        </ul>
      </Part>
    </div>
  )
}

function Part({ title, children }: { readonly title: string; readonly children: React.ReactNode }) {
  return (
    <section className="mb-8 grid gap-2">
      <h2 className="text-lg font-semibold">{title}</h2>
      {children}
    </section>
  )
}
