import { Injectable, type OnModuleInit } from '@nestjs/common'
import { METHOD_METADATA } from '@nestjs/common/constants.js'
import { DiscoveryService, MetadataScanner, Reflector } from '@nestjs/core'
import { ACCESS_RULE } from '../decorators/access.ts'

@Injectable()
export class AccessRulesService implements OnModuleInit {
  constructor(
    private readonly discovery: DiscoveryService,
    private readonly scanner: MetadataScanner,
    private readonly reflector: Reflector,
  ) {}

  onModuleInit() {
    const undeclared = this.routes().filter((route) => !route.hasRule)
    if (undeclared.length > 0) {
      throw new Error(
        `These routes declare no access rule (@Public, @SignedIn or @Roles): ${undeclared.map((route) => route.name).join(', ')}`,
      )
    }
  }

  /** Every handler of every controller. */
  routes(): { name: string; hasRule: boolean }[] {
    return this.discovery.getControllers().flatMap(({ metatype }) => {
      if (typeof metatype !== 'function') return []
      const prototype = metatype.prototype as Record<string, () => unknown>
      return this.scanner
        .getAllMethodNames(prototype)
        .map((name) => ({ name, handler: prototype[name]! }))
        .filter(({ handler }) => Reflect.hasMetadata(METHOD_METADATA, handler))
        .map(({ name, handler }) => ({
          name: `${metatype.name}.${name}`,
          hasRule: this.reflector.getAllAndOverride<unknown>(ACCESS_RULE, [handler, metatype]) !== undefined,
        }))
    })
  }
}
