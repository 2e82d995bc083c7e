import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { CertificatesModule } from '../certificates/certificates.module.ts';
import { MailModule } from '../mail/mail.module.ts';
import { PapersModule } from '../papers/papers.module.ts';
import { QuestionsModule } from '../questions/questions.module.ts';
import { AllowancesRepository } from './allowances.repository.ts';
import { AllowancesService } from './allowances.service.ts';
import { AnswersRepository } from './answers.repository.ts';
import { ClosingService } from './closing.service.ts';
import { LooksRepository } from './looks.repository.ts';
import { LooksService } from './looks.service.ts';
import { Marker } from './marker.ts';
import { MarkingService } from './marking.service.ts';
import { ItemLookModel } from './models/item-look.model.ts';
import { SittingAnswerModel } from './models/sitting-answer.model.ts';
import { SittingItemModel } from './models/sitting-item.model.ts';
import { SittingPennantModel } from './models/sitting-pennant.model.ts';
import { SittingResultModel } from './models/sitting-result.model.ts';
import { SittingModel } from './models/sitting.model.ts';
import { TimeAllowanceModel } from './models/time-allowance.model.ts';
import { PaperDrawing } from './paper-drawing.ts';
import { PapersController } from './papers.controller.ts';
import { ResultLetters } from './result-letters.ts';
import { ResultsListService } from './results-list.service.ts';
import { ResultsRepository } from './results.repository.ts';
import { ResultsService } from './results.service.ts';
import { SavingService } from './saving.service.ts';
import { SittingSheets } from './sitting-sheets.ts';
import { SittingsController } from './sittings.controller.ts';
import { SittingsJobs } from './sittings.jobs.ts';
import { SittingsRepository } from './sittings.repository.ts';
import { SittingsService } from './sittings.service.ts';
import { StandingService } from './standing.service.ts';
import { StartingService } from './starting.service.ts';

@Module({
  imports: [
    CertificatesModule,
    MailModule,
    PapersModule,
    QuestionsModule,
    SequelizeModule.forFeature([
      ItemLookModel,
      SittingAnswerModel,
      SittingItemModel,
      SittingModel,
      SittingPennantModel,
      SittingResultModel,
      TimeAllowanceModel,
    ]),
  ],
  controllers: [PapersController, SittingsController],
  providers: [
    AllowancesRepository,
    AllowancesService,
    AnswersRepository,
    ClosingService,
    LooksRepository,
    LooksService,
    Marker,
    MarkingService,
    PaperDrawing,
    ResultLetters,
    ResultsListService,
    ResultsRepository,
    ResultsService,
    SavingService,
    SittingSheets,
    SittingsJobs,
    SittingsRepository,
    SittingsService,
    StandingService,
    StartingService,
  ],
  exports: [SittingsService],
})
export class SittingsModule {}
