import { Main } from '@/components/frame/frame'
import { NotHere } from '@/components/frame/not-here'

export default function NotFoundAtDesk() {
  return (
    <Main>
      <NotHere />
    </Main>
  )
}
