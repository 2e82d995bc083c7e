import { Controller, Get } from '@nestjs/common';
import { Allow } from '../http/allow.decorator.ts';
import { Responds } from '../http/responds.decorator.ts';
import { glossarySchema, type GlossaryView } from './glossary.schemas.ts';
import { GlossaryService } from './glossary.service.ts';

@Controller('api/glossary')
export class GlossaryController {
  constructor(private readonly terms: GlossaryService) {}

  @Get()
  @Allow('signed-in')
  @Responds(200, glossarySchema)
  glossary(): Promise<GlossaryView> {
    return this.terms.glossary();
  }
}
