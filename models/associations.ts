/**
 * How tables belong together, on one page.
 * Import this file (for its effect) wherever a query uses `include`.
 */
import { Answer } from './answer'
import { ApiToken } from './api-token'
import { Asking } from './asking'
import { CaptionTrack } from './caption-track'
import { Channel } from './channel'
import { Chapter } from './chapter'
import { ChapterTopic } from './chapter-topic'
import { Claim } from './claim'
import { Correction } from './correction'
import { Cue } from './cue'
import { Episode } from './episode'
import { Explainer } from './explainer'
import { Footage } from './footage'
import { Hearing } from './hearing'
import { Membership } from './membership'
import { Planting } from './planting'
import { Question } from './question'
import { QuestionEvent } from './question-event'
import { QuestionPhoto } from './question-photo'
import { Reading } from './reading'
import { Rendition } from './rendition'
import { Season } from './season'
import { Session } from './session'
import { Source } from './source'
import { StageWindow } from './stage-window'
import { Term } from './term'
import { User } from './user'
import { Verdict } from './verdict'

User.hasMany(Membership, { as: 'memberships', foreignKey: 'userId' })
User.hasMany(Session, { as: 'sessions', foreignKey: 'userId' })
Session.belongsTo(User, { as: 'user', foreignKey: 'userId' })
ApiToken.belongsTo(User, { as: 'user', foreignKey: 'userId' })
Membership.belongsTo(User, { as: 'user', foreignKey: 'userId' })
Membership.belongsTo(Channel, { as: 'channel', foreignKey: 'channelId' })
Channel.hasMany(Membership, { as: 'memberships', foreignKey: 'channelId' })
Channel.hasMany(Episode, { as: 'episodes', foreignKey: 'channelId' })
Channel.hasMany(Season, { as: 'seasons', foreignKey: 'channelId' })

Season.belongsTo(Channel, { as: 'channel', foreignKey: 'channelId' })
Season.hasMany(Planting, { as: 'plantings', foreignKey: 'seasonId' })
Planting.belongsTo(Season, { as: 'season', foreignKey: 'seasonId' })
Planting.hasMany(StageWindow, { as: 'windows', foreignKey: 'plantingId' })

Episode.belongsTo(Channel, { as: 'channel', foreignKey: 'channelId' })
Episode.belongsTo(Season, { as: 'season', foreignKey: 'seasonId' })
Episode.belongsTo(Footage, { as: 'footage', foreignKey: 'footageId' })
Episode.hasMany(Footage, { as: 'footages', foreignKey: 'episodeId' })
Episode.hasMany(Chapter, { as: 'chapters', foreignKey: 'episodeId' })
Episode.hasMany(CaptionTrack, { as: 'tracks', foreignKey: 'episodeId' })
Episode.hasMany(Reading, { as: 'readings', foreignKey: 'episodeId' })
Episode.hasMany(Correction, { as: 'corrections', foreignKey: 'episodeId' })
Episode.hasMany(Question, { as: 'questions', foreignKey: 'episodeId' })
Episode.hasMany(Answer, { as: 'answers', foreignKey: 'episodeId' })
Footage.belongsTo(Episode, { as: 'episode', foreignKey: 'episodeId' })
Footage.hasMany(Rendition, { as: 'renditions', foreignKey: 'footageId' })
Chapter.belongsTo(Episode, { as: 'episode', foreignKey: 'episodeId' })
Chapter.hasMany(ChapterTopic, { as: 'topics', foreignKey: 'chapterId' })
CaptionTrack.belongsTo(Episode, { as: 'episode', foreignKey: 'episodeId' })
CaptionTrack.hasMany(Cue, { as: 'cues', foreignKey: 'trackId' })

Question.belongsTo(Channel, { as: 'channel', foreignKey: 'channelId' })
Question.belongsTo(User, { as: 'asker', foreignKey: 'askerId' })
Question.belongsTo(Episode, { as: 'episode', foreignKey: 'episodeId' })
Question.belongsTo(Episode, { as: 'bookedEpisode', foreignKey: 'bookedEpisodeId' })
Question.belongsTo(Question, { as: 'into', foreignKey: 'joinedInto' })
Question.hasOne(Answer, { as: 'answer', foreignKey: 'questionId' })
Question.hasMany(Asking, { as: 'askings', foreignKey: 'questionId' })
Question.hasMany(QuestionEvent, { as: 'events', foreignKey: 'questionId' })
Question.hasMany(QuestionPhoto, { as: 'photos', foreignKey: 'questionId' })
Question.hasMany(Verdict, { as: 'verdicts', foreignKey: 'questionId' })
Answer.belongsTo(Question, { as: 'question', foreignKey: 'questionId' })
Answer.belongsTo(Episode, { as: 'episode', foreignKey: 'episodeId' })
Asking.belongsTo(User, { as: 'user', foreignKey: 'userId' })
QuestionEvent.belongsTo(User, { as: 'actor', foreignKey: 'actorId' })

Explainer.hasMany(Claim, { as: 'claims', foreignKey: 'explainerId' })
Explainer.hasMany(Term, { as: 'terms', foreignKey: 'explainerId' })
Claim.belongsTo(Source, { as: 'source', foreignKey: 'sourceId' })
Term.belongsTo(Explainer, { as: 'explainer', foreignKey: 'explainerId' })
Term.hasMany(Hearing, { as: 'hearings', foreignKey: 'termId' })
Hearing.belongsTo(Episode, { as: 'episode', foreignKey: 'episodeId' })
Hearing.belongsTo(Term, { as: 'term', foreignKey: 'termId' })
