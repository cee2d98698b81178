import type { Routes } from '@/lib/http/openapi'
import * as adminPeople from '../admin/people/route'
import * as adminPeopleId from '../admin/people/[id]/route'
import * as channels from '../channels/route'
import * as channelsChannel from '../channels/[channel]/route'
import * as channelsChannelEpisodes from '../channels/[channel]/episodes/route'
import * as channelsChannelPeople from '../channels/[channel]/people/route'
import * as channelsChannelPeoplePerson from '../channels/[channel]/people/[person]/route'
import * as channelsChannelSeasons from '../channels/[channel]/seasons/route'
import * as channelsChannelSeasonsYear from '../channels/[channel]/seasons/[year]/route'
import * as episodesId from '../episodes/[id]/route'
import * as episodesIdCaptions from '../episodes/[id]/captions/route'
import * as episodesIdCaptionsLanguage from '../episodes/[id]/captions/[language]/route'
import * as episodesIdChapters from '../episodes/[id]/chapters/route'
import * as episodesIdChaptersJson from '../episodes/[id]/chapters.json/route'
import * as episodesIdChaptersVtt from '../episodes/[id]/chapters.vtt/route'
import * as episodesIdCorrections from '../episodes/[id]/corrections/route'
import * as episodesIdFootage from '../episodes/[id]/footage/route'
import * as episodesIdFootageRetry from '../episodes/[id]/footage/retry/route'
import * as episodesIdPublish from '../episodes/[id]/publish/route'
import * as episodesIdReadings from '../episodes/[id]/readings/route'
import * as episodesIdWalkRound from '../episodes/[id]/walk-round/route'
import * as episodesIdWithdraw from '../episodes/[id]/withdraw/route'
import * as explainers from '../explainers/route'
import * as explainersSlug from '../explainers/[slug]/route'
import * as health from '../health/route'
import * as me from '../me/route'
import * as meSessions from '../me/sessions/route'
import * as meTokens from '../me/tokens/route'
import * as meTokensId from '../me/tokens/[id]/route'
import * as questions from '../questions/route'
import * as questionsId from '../questions/[id]/route'
import * as questionsIdAnswer from '../questions/[id]/answer/route'
import * as questionsIdAskDetail from '../questions/[id]/ask-detail/route'
import * as questionsIdAsking from '../questions/[id]/asking/route'
import * as questionsIdBook from '../questions/[id]/book/route'
import * as questionsIdJoin from '../questions/[id]/join/route'
import * as questionsIdQueue from '../questions/[id]/queue/route'
import * as questionsIdSetAside from '../questions/[id]/set-aside/route'
import * as questionsIdToAdviser from '../questions/[id]/to-adviser/route'
import * as questionsIdVerdict from '../questions/[id]/verdict/route'
import * as questionsSimilar from '../questions/similar/route'
import * as ready from '../ready/route'
import * as search from '../search/route'
import * as terms from '../terms/route'
import * as termsSlug from '../terms/[slug]/route'
import * as topics from '../topics/route'

/** Every route of the API by its address. A unit test holds this list against the folder. */
export const routes: Routes = {
  '/api/admin/people': adminPeople,
  '/api/admin/people/{id}': adminPeopleId,
  '/api/channels': channels,
  '/api/channels/{channel}': channelsChannel,
  '/api/channels/{channel}/episodes': channelsChannelEpisodes,
  '/api/channels/{channel}/people': channelsChannelPeople,
  '/api/channels/{channel}/people/{person}': channelsChannelPeoplePerson,
  '/api/channels/{channel}/seasons': channelsChannelSeasons,
  '/api/channels/{channel}/seasons/{year}': channelsChannelSeasonsYear,
  '/api/episodes/{id}': episodesId,
  '/api/episodes/{id}/captions': episodesIdCaptions,
  '/api/episodes/{id}/captions/{language}': episodesIdCaptionsLanguage,
  '/api/episodes/{id}/chapters': episodesIdChapters,
  '/api/episodes/{id}/chapters.json': episodesIdChaptersJson,
  '/api/episodes/{id}/chapters.vtt': episodesIdChaptersVtt,
  '/api/episodes/{id}/corrections': episodesIdCorrections,
  '/api/episodes/{id}/footage': episodesIdFootage,
  '/api/episodes/{id}/footage/retry': episodesIdFootageRetry,
  '/api/episodes/{id}/publish': episodesIdPublish,
  '/api/episodes/{id}/readings': episodesIdReadings,
  '/api/episodes/{id}/walk-round': episodesIdWalkRound,
  '/api/episodes/{id}/withdraw': episodesIdWithdraw,
  '/api/explainers': explainers,
  '/api/explainers/{slug}': explainersSlug,
  '/api/health': health,
  '/api/me': me,
  '/api/me/sessions': meSessions,
  '/api/me/tokens': meTokens,
  '/api/me/tokens/{id}': meTokensId,
  '/api/questions': questions,
  '/api/questions/{id}': questionsId,
  '/api/questions/{id}/answer': questionsIdAnswer,
  '/api/questions/{id}/ask-detail': questionsIdAskDetail,
  '/api/questions/{id}/asking': questionsIdAsking,
  '/api/questions/{id}/book': questionsIdBook,
  '/api/questions/{id}/join': questionsIdJoin,
  '/api/questions/{id}/queue': questionsIdQueue,
  '/api/questions/{id}/set-aside': questionsIdSetAside,
  '/api/questions/{id}/to-adviser': questionsIdToAdviser,
  '/api/questions/{id}/verdict': questionsIdVerdict,
  '/api/questions/similar': questionsSimilar,
  '/api/ready': ready,
  '/api/search': search,
  '/api/terms': terms,
  '/api/terms/{slug}': termsSlug,
  '/api/topics': topics,
}
