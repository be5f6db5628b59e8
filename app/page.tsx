import { redirect } from 'next/navigation'
import { homeOf } from '@/components/frame/desk-words'
import { deskActor } from '@/lib/desk'

export default async function Home() {
  const actor = await deskActor()
  redirect(homeOf(actor.role))
}
