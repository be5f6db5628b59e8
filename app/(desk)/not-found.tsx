import { ReadingSheet } from '@/components/frame/sheets'

export default function NotHere() {
  return (
    <ReadingSheet title="Nothing here">
      <p className="max-w-reading">
        There is no such page, or it is not one for your role. The words at the top lead to the
        pages you have.
      </p>
    </ReadingSheet>
  )
}
