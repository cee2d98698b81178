import { NotHere } from '@/components/frame/not-here'

export default function NotFoundOnSite() {
  return <NotHere />
}
