// Written by server/scripts/openapi.mjs from the routes of the server. Do not edit.

export interface paths {
  '/api/audit-entries': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    /** Who did what, newest first. */
    get: operations['Audit_list'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/email-change-completions': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** Takes over the new address of an account. */
    post: operations['Accounts_completeEmailChange'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/email-changes': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** Sends a link to the new address. */
    post: operations['Profile_askForEmail'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/first-owner': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** Makes the first owner, while there is nobody yet. */
    post: operations['Accounts_makeFirstOwner'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/health': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    /** The process is alive. */
    get: operations['Health_live'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/health/ready': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    /** The process can take requests: it is not stopping, and the database answers in time. */
    get: operations['Health_ready'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/invitation-completions': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** Joins the staff by choosing a password. */
    post: operations['Accounts_completeInvitation'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/invitations': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** Asks somebody to join the staff, by mail. */
    post: operations['Staff_invite'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/outbox-mails': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Outbox_list'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/outbox-mails/{id}/retry': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** Sends again what was given up or may not have left. */
    post: operations['Outbox_retry'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/parts': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Parts_create'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/parts/{code}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put: operations['Parts_edit'];
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/parts/{code}/bring-back': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Parts_bringBack'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/parts/{code}/retire': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Parts_retire'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/password-changes': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Profile_changePassword'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/password-reset-completions': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Accounts_completeReset'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/password-resets': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** Asks for a new password; the mail that follows says what happened. */
    post: operations['Accounts_askForPassword'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/profile': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Profile_read'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch: operations['Profile_edit'];
    trace?: never;
  };
  '/api/session': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    /** Who is signed in, and the token for changes. */
    get: operations['Sessions_current'];
    put?: never;
    post: operations['Sessions_signIn'];
    delete: operations['Sessions_signOut'];
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/sessions': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    /** Where one is signed in. */
    get: operations['Sessions_list'];
    put?: never;
    post?: never;
    /** Signs out everywhere else. */
    delete: operations['Sessions_endOthers'];
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/sessions/{key}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post?: never;
    delete: operations['Sessions_end'];
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/sign-up-completions': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** Confirms the address by choosing a password. */
    post: operations['Accounts_completeSignUp'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/sign-ups': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** Asks for an account; the mail that follows says what happened. */
    post: operations['Accounts_signUp'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/staff': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Staff_list'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/staff/{id}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    /** Changes somebody's role, or whether they may sign in. */
    patch: operations['Staff_edit'];
    trace?: never;
  };
  '/api/staff/{id}/invitations': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** Sends the invitation again; the link before stops working. */
    post: operations['Staff_inviteAgain'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/staff/{id}/sessions': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post?: never;
    /** Signs somebody out everywhere. */
    delete: operations['Staff_endSessions'];
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/suppliers': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Suppliers_list'];
    put?: never;
    post: operations['Suppliers_create'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/suppliers/{code}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Suppliers_get'];
    put: operations['Suppliers_edit'];
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
}
export type webhooks = Record<string, never>;
export interface components {
  schemas: {
    AuditEntryDto: {
      action: string;
      actorId: number | null;
      /** @description The name at that time; null for what the product did by itself. */
      actorName: string | null;
      /** @enum {string|null} */
      actorRole: 'owner' | 'assembler' | 'accountant' | 'customer' | null;
      after: {
        [key: string]: unknown;
      } | null;
      before: {
        [key: string]: unknown;
      } | null;
      id: number;
      recordedAt: string;
      subjectCode: string | null;
      subjectId: number | null;
      subjectKind: string;
    };
    AuditPageDto: {
      items: components['schemas']['AuditEntryDto'][];
      total: number;
    };
    EmailChangeDto: {
      /** Format: password */
      currentPassword: string;
      /** Format: email */
      email: string;
    };
    EmailOnlyDto: {
      /** Format: email */
      email: string;
    };
    /**
     * @description What the client decides by.
     * @enum {string}
     */
    ErrorCode:
      | 'invalid_input'
      | 'not_signed_in'
      | 'wrong_credentials'
      | 'stale_form'
      | 'not_allowed'
      | 'not_found'
      | 'changed_meanwhile'
      | 'wrong_state'
      | 'already_exists'
      | 'not_enough_stock'
      | 'link_expired'
      | 'too_large'
      | 'unsupported_media'
      | 'rule_broken'
      | 'key_reused'
      | 'too_many_tries'
      | 'unexpected'
      | 'service_unavailable';
    FieldFaultDto: {
      code: string;
      detail: string;
      /** @description JSON pointer to the field, such as `/lines/0/quantity`. */
      pointer: string;
    };
    FirstOwnerDto: {
      /** Format: email */
      email: string;
      name: string;
      /** Format: password */
      password: string;
      /** @description Printed when the server starts, while nobody can sign in yet. */
      setupCode: string;
    };
    HealthDto: {
      /** @enum {string} */
      status: 'ok';
    };
    InvitationDto: {
      /** Format: email */
      email: string;
      name: string;
      /** @enum {string} */
      role: 'owner' | 'assembler' | 'accountant';
    };
    LinkDto: {
      token: string;
    };
    LinkWithPasswordDto: {
      /**
       * Format: password
       * @description At least 8 characters; a short sentence is best.
       */
      password: string;
      token: string;
    };
    /** @enum {string} */
    MailState: 'waiting' | 'sent' | 'given_up' | 'uncertain';
    OutboxMailDto: {
      attempts: number;
      createdAt: string;
      id: number;
      /** @description What the mail server, or the line to it, said last. */
      lastError: string | null;
      sentAt: string | null;
      state: components['schemas']['MailState'];
      subject: string;
      to: string;
    };
    OutboxPageDto: {
      items: components['schemas']['OutboxMailDto'][];
      total: number;
    };
    OwnSessionDto: {
      address: string;
      current: boolean;
      /** @description What the browser calls itself. */
      device: string;
      /** @description Names the session to end it; does not let anybody in. */
      key: string;
      lastSeenAt: string;
      startedAt: string;
    };
    OwnSessionsDto: {
      items: components['schemas']['OwnSessionDto'][];
    };
    PartBatteryDto: {
      cellCount?: number | null;
      /** @enum {string} */
      chemistry: 'lithium_ion' | 'lithium_metal';
      /** @enum {string} */
      kind: 'cell' | 'battery';
      /**
       * Format: decimal
       * @example 12.5
       */
      lithiumGrams?: string | null;
      /**
       * Format: date
       * @example 2027-02-28
       */
      transportTestPassedOn?: string | null;
      /** @description The test summary of this very design (UN Manual of Tests and Criteria, 38.3). */
      transportTestReference?: string | null;
      /**
       * Format: decimal
       * @example 12.5
       */
      wattHours?: string | null;
    };
    PartDto: {
      battery?: components['schemas']['PartBatteryDto'] | null;
      code: string;
      commodityCode?: string | null;
      description?: string | null;
      id: number;
      /**
       * @description The stock unit; it stays once something has moved.
       * @enum {string}
       */
      measure: 'piece' | 'set' | 'pair' | 'm' | 'mm' | 'kg' | 'g' | 'l' | 'ml';
      /** @description Whether measure and the way it is followed stay as they are, because something has moved. */
      moved: boolean;
      name: string;
      originCountryCode?: string | null;
      parameters: components['schemas']['PartParameterDto'][];
      /**
       * Format: decimal
       * @example 12.5
       */
      reorderPoint?: string | null;
      retiredOn: string | null;
      /** @description The letters that begin the serial numbers of a part followed one by one. */
      serialLetters?: string | null;
      shelfLifeDays?: number | null;
      suppliers: components['schemas']['PartSupplierDto'][];
      /**
       * @description It stays once something has moved.
       * @enum {string}
       */
      traced: 'count' | 'delivery' | 'single';
      /**
       * Format: decimal
       * @example 12.5
       */
      unitWeightG?: string | null;
      version: number;
    };
    PartEditDto: {
      battery?: components['schemas']['PartBatteryDto'] | null;
      code: string;
      commodityCode?: string | null;
      description?: string | null;
      /**
       * @description The stock unit; it stays once something has moved.
       * @enum {string}
       */
      measure: 'piece' | 'set' | 'pair' | 'm' | 'mm' | 'kg' | 'g' | 'l' | 'ml';
      name: string;
      originCountryCode?: string | null;
      parameters: components['schemas']['PartParameterDto'][];
      /**
       * Format: decimal
       * @example 12.5
       */
      reorderPoint?: string | null;
      /** @description The letters that begin the serial numbers of a part followed one by one. */
      serialLetters?: string | null;
      shelfLifeDays?: number | null;
      suppliers: components['schemas']['PartSupplierDto'][];
      /**
       * @description It stays once something has moved.
       * @enum {string}
       */
      traced: 'count' | 'delivery' | 'single';
      /**
       * Format: decimal
       * @example 12.5
       */
      unitWeightG?: string | null;
      version: number;
    };
    PartInputDto: {
      battery?: components['schemas']['PartBatteryDto'] | null;
      code: string;
      commodityCode?: string | null;
      description?: string | null;
      /**
       * @description The stock unit; it stays once something has moved.
       * @enum {string}
       */
      measure: 'piece' | 'set' | 'pair' | 'm' | 'mm' | 'kg' | 'g' | 'l' | 'ml';
      name: string;
      originCountryCode?: string | null;
      parameters: components['schemas']['PartParameterDto'][];
      /**
       * Format: decimal
       * @example 12.5
       */
      reorderPoint?: string | null;
      /** @description The letters that begin the serial numbers of a part followed one by one. */
      serialLetters?: string | null;
      shelfLifeDays?: number | null;
      suppliers: components['schemas']['PartSupplierDto'][];
      /**
       * @description It stays once something has moved.
       * @enum {string}
       */
      traced: 'count' | 'delivery' | 'single';
      /**
       * Format: decimal
       * @example 12.5
       */
      unitWeightG?: string | null;
    };
    PartParameterDto: {
      name: string;
      /** @description Of a number: its unit. */
      unit?: string | null;
      /** @description A decimal number, or a word. */
      value: string;
    };
    PartRetireDto: {
      version: number;
    };
    PartSupplierDto: {
      leadTimeDays?: number | null;
      /** @description The one to order from first; at most one of a part's suppliers. */
      preferred: boolean;
      /** @description The supplier's code. */
      supplier: string;
      supplierPartCode?: string | null;
    };
    PasswordChangeDto: {
      /** Format: password */
      currentPassword: string;
      /** Format: password */
      newPassword: string;
    };
    PersonDto: {
      email: string;
      id: number;
      name: string;
      role: components['schemas']['Role'];
    };
    ProblemDto: {
      /** @description What the client decides by. */
      code: components['schemas']['ErrorCode'];
      /** @description The newer state that an edit collided with. */
      current?: {
        [key: string]: unknown;
      };
      /** @description A sentence for a person. */
      detail: string;
      errors: components['schemas']['FieldFaultDto'][];
      /** @description Names the request in the log. */
      requestId: string;
      /** @description When it makes sense to try again. */
      retryAfterSeconds?: number;
      status: number;
      title: string;
      type: string;
    };
    ProfileDto: {
      email: string;
      id: number;
      memberSince: string;
      name: string;
      role: components['schemas']['Role'];
      version: number;
    };
    ProfileEditDto: {
      name: string;
      version: number;
    };
    /** @enum {string} */
    Role: 'owner' | 'assembler' | 'accountant' | 'customer';
    SessionDto: {
      /** @description To be sent back in `x-csrf-token` with every change; a new one comes with signing in and out. */
      csrfToken: string;
      /** @description True until the first owner is made. */
      needsOwner: boolean;
      /** @description Null for a visitor. */
      person: components['schemas']['PersonDto'] | null;
      /** @description Null until the shop is set up. */
      shop: components['schemas']['SessionShopDto'] | null;
    };
    SessionShopDto: {
      currency: string;
      name: string;
      timeZone: string;
    };
    SignInDto: {
      /** Format: email */
      email: string;
      /** Format: password */
      password: string;
    };
    SignUpDto: {
      /** Format: email */
      email: string;
      name: string;
    };
    StaffEditDto: {
      /** @enum {string} */
      role?: 'owner' | 'assembler' | 'accountant';
      /**
       * @description Whether they may sign in.
       * @enum {string}
       */
      status?: 'active' | 'disabled';
      version: number;
    };
    StaffMemberDto: {
      email: string;
      id: number;
      name: string;
      role: components['schemas']['StaffRole'];
      status: components['schemas']['UserStatus'];
      version: number;
    };
    StaffPageDto: {
      items: components['schemas']['StaffMemberDto'][];
      total: number;
    };
    /** @enum {string} */
    StaffRole: 'owner' | 'assembler' | 'accountant';
    SuppliedPartDto: {
      code: string;
      leadTimeDays: number | null;
      name: string;
      preferred: boolean;
      supplierPartCode: string | null;
    };
    SupplierDeliveryDto: {
      deliveryNote: string | null;
      lotCount: number;
      number: string;
      receivedOn: string;
    };
    SupplierDto: {
      code: string;
      countryCode?: string | null;
      /** @description The currency it bills in. */
      currency: string;
      /** @description The latest, newest first. */
      deliveries: components['schemas']['SupplierDeliveryDto'][];
      /** Format: email */
      email?: string | null;
      id: number;
      /** @description Days from order to delivery, where a part says nothing else. */
      leadTimeDays?: number | null;
      name: string;
      note?: string | null;
      parts: components['schemas']['SuppliedPartDto'][];
      phone?: string | null;
      version: number;
    };
    SupplierEditDto: {
      code: string;
      countryCode?: string | null;
      /** @description The currency it bills in. */
      currency: string;
      /** Format: email */
      email?: string | null;
      /** @description Days from order to delivery, where a part says nothing else. */
      leadTimeDays?: number | null;
      name: string;
      note?: string | null;
      phone?: string | null;
      version: number;
    };
    SupplierInputDto: {
      code: string;
      countryCode?: string | null;
      /** @description The currency it bills in. */
      currency: string;
      /** Format: email */
      email?: string | null;
      /** @description Days from order to delivery, where a part says nothing else. */
      leadTimeDays?: number | null;
      name: string;
      note?: string | null;
      phone?: string | null;
    };
    SupplierItemDto: {
      code: string;
      countryCode: string | null;
      id: number;
      /** @description The day of the latest delivery. */
      lastReceivedOn: string | null;
      leadTimeDays: number | null;
      name: string;
      /** @description How many parts can be bought there. */
      partCount: number;
    };
    SupplierPageDto: {
      items: components['schemas']['SupplierItemDto'][];
      total: number;
    };
    /** @enum {string} */
    UserStatus: 'invited' | 'unconfirmed' | 'active' | 'disabled';
  };
  responses: never;
  parameters: never;
  requestBodies: never;
  headers: never;
  pathItems: never;
}
export type $defs = Record<string, never>;
export interface operations {
  Audit_list: {
    parameters: {
      query?: {
        /** @description The start of an action's name: `user` finds all that was done to people's accounts. */
        action?: string;
        actorId?: number;
        actorRole?: 'owner' | 'assembler' | 'accountant' | 'customer';
        /** @description First day, in the shop's zone. */
        from?: string;
        page?: number;
        pageSize?: number;
        /** @description Words to look for. */
        q?: string;
        /** @description A column to sort by; a hyphen in front turns the order round. */
        sort?: string;
        subjectId?: number;
        subjectKind?: string;
        /** @description Last day, in the shop's zone. */
        to?: string;
      };
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['AuditPageDto'];
        };
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Accounts_completeEmailChange: {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['LinkDto'];
      };
    };
    responses: {
      204: {
        headers: {
          [name: string]: unknown;
        };
        content?: never;
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Profile_askForEmail: {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['EmailChangeDto'];
      };
    };
    responses: {
      202: {
        headers: {
          [name: string]: unknown;
        };
        content?: never;
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Accounts_makeFirstOwner: {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['FirstOwnerDto'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['SessionDto'];
        };
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Health_live: {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['HealthDto'];
        };
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Health_ready: {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['HealthDto'];
        };
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Accounts_completeInvitation: {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['LinkWithPasswordDto'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['SessionDto'];
        };
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Staff_invite: {
    parameters: {
      query?: never;
      header: {
        /** @description Made afresh for each thing to create, and kept when the same request is sent again. */
        'Idempotency-Key': string;
      };
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['InvitationDto'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['StaffMemberDto'];
        };
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Outbox_list: {
    parameters: {
      query?: {
        page?: number;
        pageSize?: number;
        /** @description Words to look for. */
        q?: string;
        /** @description A column to sort by; a hyphen in front turns the order round. */
        sort?: string;
        state?: 'waiting' | 'sent' | 'given_up' | 'uncertain';
      };
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['OutboxPageDto'];
        };
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Outbox_retry: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      204: {
        headers: {
          [name: string]: unknown;
        };
        content?: never;
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Parts_create: {
    parameters: {
      query?: never;
      header: {
        /** @description Made afresh for each thing to create, and kept when the same request is sent again. */
        'Idempotency-Key': string;
      };
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['PartInputDto'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['PartDto'];
        };
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Parts_edit: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        code: string;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['PartEditDto'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['PartDto'];
        };
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Parts_bringBack: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        code: string;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['PartRetireDto'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['PartDto'];
        };
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Parts_retire: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        code: string;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['PartRetireDto'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['PartDto'];
        };
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Profile_changePassword: {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['PasswordChangeDto'];
      };
    };
    responses: {
      204: {
        headers: {
          [name: string]: unknown;
        };
        content?: never;
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Accounts_completeReset: {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['LinkWithPasswordDto'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['SessionDto'];
        };
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Accounts_askForPassword: {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['EmailOnlyDto'];
      };
    };
    responses: {
      202: {
        headers: {
          [name: string]: unknown;
        };
        content?: never;
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Profile_read: {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProfileDto'];
        };
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Profile_edit: {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['ProfileEditDto'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProfileDto'];
        };
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Sessions_current: {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['SessionDto'];
        };
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Sessions_signIn: {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['SignInDto'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['SessionDto'];
        };
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Sessions_signOut: {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      204: {
        headers: {
          [name: string]: unknown;
        };
        content?: never;
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Sessions_list: {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['OwnSessionsDto'];
        };
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Sessions_endOthers: {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      204: {
        headers: {
          [name: string]: unknown;
        };
        content?: never;
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Sessions_end: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        key: string;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      204: {
        headers: {
          [name: string]: unknown;
        };
        content?: never;
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Accounts_completeSignUp: {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['LinkWithPasswordDto'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['SessionDto'];
        };
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Accounts_signUp: {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['SignUpDto'];
      };
    };
    responses: {
      202: {
        headers: {
          [name: string]: unknown;
        };
        content?: never;
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Staff_list: {
    parameters: {
      query?: {
        page?: number;
        pageSize?: number;
        /** @description Words to look for. */
        q?: string;
        /** @description A column to sort by; a hyphen in front turns the order round. */
        sort?: string;
      };
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['StaffPageDto'];
        };
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Staff_edit: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['StaffEditDto'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['StaffMemberDto'];
        };
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Staff_inviteAgain: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      204: {
        headers: {
          [name: string]: unknown;
        };
        content?: never;
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Staff_endSessions: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      204: {
        headers: {
          [name: string]: unknown;
        };
        content?: never;
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Suppliers_list: {
    parameters: {
      query?: {
        page?: number;
        pageSize?: number;
        /** @description Words to look for. */
        q?: string;
        /** @description A column to sort by; a hyphen in front turns the order round. */
        sort?: string;
      };
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['SupplierPageDto'];
        };
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Suppliers_create: {
    parameters: {
      query?: never;
      header: {
        /** @description Made afresh for each thing to create, and kept when the same request is sent again. */
        'Idempotency-Key': string;
      };
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['SupplierInputDto'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['SupplierDto'];
        };
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Suppliers_get: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        code: string;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['SupplierDto'];
        };
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
  Suppliers_edit: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        code: string;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['SupplierEditDto'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['SupplierDto'];
        };
      };
      /** @description A refusal, as RFC 9457 describes it. */
      default: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProblemDto'];
        };
      };
    };
  };
}
