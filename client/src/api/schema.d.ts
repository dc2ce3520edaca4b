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
  '/api/batches': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Batches_list'];
    put?: never;
    /** Plans a batch and claims for it what is free on the shelf. */
    post: operations['Batches_plan'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/batches/{number}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Batches_open'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/batches/{number}/building': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** Begins building: the units get their serial numbers. */
    post: operations['Batches_start'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/batches/{number}/claims': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** Claims what is missing, as far as it has come onto the shelf. */
    post: operations['Batches_claim'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/batches/{number}/issues': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Batches_issue'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/batches/{number}/labels': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Units_labels'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/batches/{number}/made-pieces': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** Puts made pieces on the shelf, of a part that is not followed one by one. */
    post: operations['Batches_completePieces'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/batches/{number}/pick-list': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Batches_pickList'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/batches/{number}/returns': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Batches_giveBack'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/batches/{number}/steps/{position}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put: operations['Batches_tick'];
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/batches/{number}/sub-assemblies': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    /** While it is only planned: from the shelf, or built within the batch. */
    put: operations['Batches_choose'];
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/batches/{number}/withdrawal': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Batches_withdraw'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/bill-components': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    /** Parts that can stand in a bill or a kit. */
    get: operations['Bills_components'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/bills': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    /** Parts with a bill, released or in draft. */
    get: operations['Bills_list'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/bills/{code}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    /** The revisions of a part's bill. */
    get: operations['Bills_open'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/bills/{code}/comparison': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    /** Two revisions, line by line. */
    get: operations['Bills_compare'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/bills/{code}/revisions': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Bills_create'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/bills/{code}/revisions/{number}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Bills_revision'];
    /** Saves a draft whole. */
    put: operations['Bills_edit'];
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/bills/{code}/revisions/{number}/buildable': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    /** How many could be built now, and what stops the next one. */
    get: operations['DesignFigures_buildable'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/bills/{code}/revisions/{number}/cost': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    /** What one costs today. */
    get: operations['DesignFigures_cost'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/bills/{code}/revisions/{number}/discard': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** Throws a draft away. */
    post: operations['Bills_discard'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/bills/{code}/revisions/{number}/release': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** Puts a draft in force; it cannot change from then on. */
    post: operations['Bills_release'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/bills/{code}/revisions/{number}/tree': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    /** A revision over all levels: each place, and each part summed. */
    get: operations['Bills_tree'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/bills/{code}/where-used': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    /** What a part is in, at every level. */
    get: operations['Bills_whereUsed'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/bins': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Bins_list'];
    put?: never;
    post: operations['Bins_create'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/bins/{code}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Bins_get'];
    put: operations['Bins_edit'];
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/bins/{code}/bring-back': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Bins_bringBack'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/bins/{code}/retire': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Bins_retire'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/book-exports/entries.csv': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Exports_entries'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/book-exports/invoices.csv': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Exports_invoices'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/book-exports/totals': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Exports_totals'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/countries': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Shop_countries'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/deliveries': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Deliveries_list'];
    put?: never;
    post: operations['Deliveries_receive'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/deliveries/{number}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Deliveries_get'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/delivery-rates': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['TaxSettings_deliveryRates'];
    put?: never;
    post: operations['TaxSettings_addDeliveryRate'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/delivery-rates/{id}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post?: never;
    delete: operations['TaxSettings_removeDeliveryRate'];
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/design-queue': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    /** Drafts that wait for release, and released bills that cannot be built to. */
    get: operations['DesignFigures_designQueue'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/desk-orders': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['OrderDesk_list'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/desk-orders/{code}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['OrderDesk_get'];
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
  '/api/faults': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Testing_listFaults'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/faults/{number}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Testing_openFault'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/faults/{number}/no-fault': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Testing_noFault'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/faults/{number}/rework': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Testing_rework'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/find': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    /** Things whose code, name or serial fits; the very code first. */
    get: operations['Find_list'];
    put?: never;
    post?: never;
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
  '/api/first-passes': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    /** How many units passed the first time they were measured. */
    get: operations['Testing_firstPasses'];
    put?: never;
    post?: never;
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
  '/api/imports': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    /** Files taken in so far, newest first. */
    get: operations['Imports_list'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/imports/{kind}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Imports_apply'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/imports/{kind}/dry-run': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** Says what the file would do; changes nothing. */
    post: operations['Imports_dryRun'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/imports/{kind}/template': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Imports_template'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/imports/kinds': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Imports_listKinds'];
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
  '/api/invoices': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Invoices_list'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/invoices/{code}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Invoices_get'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/invoices/{code}/pdf': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    /** The paper, also for the buyer whose it is. */
    get: operations['Invoices_pdf'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/journal-entries': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Books_journal'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/kits': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    /** Parts that have a contents list. */
    get: operations['Contents_list'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/kits/{code}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    /** What goes into which bag, and what it should weigh. */
    get: operations['Contents_open'];
    /** Saves a contents list whole. */
    put: operations['Contents_edit'];
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/lots': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Lots_list'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/lots/{code}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Lots_get'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/lots/{code}/status': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** Anybody at the bench may hold a lot back; to let it go again is the owner's. */
    post: operations['Lots_changeStatus'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/order-cancellations': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** Cancels an order that has not left: what was paid goes back with a credit note, what was claimed is free. */
    post: operations['Cancellations_cancel'];
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
  '/api/own-orders': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    /** The orders of the customer who is signed in. */
    get: operations['BuyerOrders_list'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/parcels': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Parcels_list'];
    put?: never;
    /** Opens a parcel for an order; the one that is open already is given again. */
    post: operations['Parcels_open'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/parcels/{code}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Parcels_get'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/parcels/{code}/carrier-answer': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** The owner writes down what the carrier answered. */
    post: operations['Parcels_carrierAnswer'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/parcels/{code}/dispatch': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** Sends it off. */
    post: operations['Parcels_dispatch'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/parcels/{code}/items/{id}/taken-out': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Parcels_takeOut'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/parcels/{code}/lithium': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    /** How it travels and what it weighs: the answer about lithium follows from it. */
    put: operations['Parcels_sayLithium'];
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/parcels/{code}/packed': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Parcels_close'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/parcels/{code}/packing-slip': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Parcels_slip'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/parcels/{code}/reopened': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Parcels_reopen'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/parcels/{code}/scans': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Parcels_scan'];
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
    get: operations['Shelf_listParts'];
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
    /** One part's whole story. */
    get: operations['Shelf_getPart'];
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
  '/api/payment-events': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** Called by the payments service; its signature over the raw bytes is what lets it in. */
    post: operations['Payments_receive'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/payment-reviews/{id}/settled': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['PaymentReviews_settle'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/payments': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Books_payments'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/periods': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Exports_months'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/periods/{month}/closed': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Exports_close'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/periods/{month}/reopened': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Exports_reopen'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/posting-rules': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Books_postingRules'];
    put?: never;
    post?: never;
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
  '/api/shelf-queue': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Shelf_readQueue'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/shop': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    /** Who the shop is, and where it delivers. */
    get: operations['Storefront_front'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/shop-settings': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Shop_read'];
    put: operations['Shop_edit'];
    post: operations['Shop_setUp'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/shop/closed-days': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Shop_closedDays'];
    put?: never;
    post: operations['Shop_close'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/shop/closed-days/{day}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post?: never;
    delete: operations['Shop_open'];
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/shop/listings': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Storefront_list'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/shop/listings/{slug}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Storefront_product'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/shop/orders': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** Orders what is in the basket, with obligation to pay. */
    post: operations['Checkout_order'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/shop/orders/{number}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    /** One order, for its buyer: signed in, or by the token of the link. */
    get: operations['BuyerOrders_open'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/shop/orders/{number}/payment-pages': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** Opens the payment page of an order that is not paid yet. */
    post: operations['Checkout_payAgain'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/shop/quotes': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** Prices a basket; claims nothing. */
    post: operations['Storefront_quote'];
    delete?: never;
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
  '/api/stock-adjustments': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['StockMoves_adjust'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/stock-documents/{number}/reversal': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** Takes back a delivery, transfer or adjustment that was wrong, by a document that does the opposite. */
    post: operations['StockMoves_reverse'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/stock-moves': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['StockMoves_list'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/stock-transfers': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['StockMoves_transfer'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/stock-value': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Shelf_readValue'];
    put?: never;
    post?: never;
    delete?: never;
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
  '/api/today': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Today_get'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/trial-balance': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Books_trialBalance'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/unit-pages/{token}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    /** Opened by the code on a unit's label; kept out of search engines. */
    get: operations['Units_publicPage'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/units': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Units_list'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/units/{serial}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Units_open'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/units/{serial}/completion': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** Puts a sound unit on the shelf. */
    post: operations['Batches_complete'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/units/{serial}/faults': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Testing_report'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/units/{serial}/fitted-lots': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** A lot scanned to a unit: the record then says exactly that it is in it. */
    post: operations['Batches_fitLot'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/units/{serial}/label': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Units_label'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/units/{serial}/readings': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** One reading, applied once by its key; the run it belongs to begins and ends by itself. */
    post: operations['Testing_record'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/units/{serial}/scrapping': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    /** Gives a unit up for good. */
    post: operations['Batches_scrap'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/units/{serial}/test-runs': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Testing_list'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/vat-exceptions': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['TaxSettings_vatExceptions'];
    put?: never;
    post: operations['TaxSettings_addVatException'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/vat-exceptions/{country}/{prefix}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post?: never;
    delete: operations['TaxSettings_removeVatException'];
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/vat-rates': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['TaxSettings_vatRates'];
    put?: never;
    post: operations['TaxSettings_addVatRate'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/vat-rates/{id}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post?: never;
    delete: operations['TaxSettings_removeVatRate'];
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
}
export type webhooks = Record<string, never>;
export interface components {
  schemas: {
    AccountBalanceDto: {
      account: string;
      /** @description Debit less credit. */
      balance: components['schemas']['MoneyDto'];
      credit: components['schemas']['MoneyDto'];
      debit: components['schemas']['MoneyDto'];
      kind: string;
      name: string;
    };
    AdjustmentInputDto: {
      lines: components['schemas']['AdjustmentLineDto'][];
      /** @description What happened, for whoever reads it later. */
      note: string;
      /** @enum {string} */
      reason: 'counted' | 'damaged' | 'found' | 'lost';
    };
    AdjustmentLineDto: {
      bin: string;
      /** @description Not needed for a part followed by count. */
      lot?: string | null;
      part: string;
      /**
       * Format: decimal
       * @description How much was found, lost or damaged; where it was counted, how much lies there.
       * @example 12.5
       */
      quantity: string;
      /** @description Cost of one stock unit of what was found, in the shop's currency; left out, the shelf's average counts. */
      unitCost?: string | null;
    };
    AppliedImportDto: {
      appliedAt: string;
      appliedBy: string;
      /** @description The document that carries what was taken in. */
      document: string | null;
      fileName: string;
      id: number;
      kind: string;
      notes: string[];
      rowCount: number;
      title: string;
    };
    AsBuiltDto: {
      /** @description Scanned to this unit; otherwise one of the lots picked for its batch. */
      exact: boolean;
      fittedAt: string;
      /** @description Null for a part followed by count. */
      lot: string | null;
      measure: string;
      part: string;
      partName: string;
      path: string;
      quantity: string;
      supplier: string | null;
    };
    AuditEntryDto: {
      action: string;
      actorId: number | null;
      /** @description The name at that time; null for what the product did by itself. */
      actorName: string | null;
      /** @enum {string|null} */
      actorRole: 'accountant' | 'assembler' | 'customer' | 'owner' | null;
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
    BasketDto: {
      country: string;
      lines: components['schemas']['BasketLineDto'][];
      postcode?: string;
    };
    BasketLineDto: {
      listingId: number;
      quantity: number;
    };
    BatchCharacteristicDto: {
      caution: string | null;
      condition: string | null;
      digits: number | null;
      /** @enum {string} */
      kind: 'numeric' | 'yes_no';
      lowerLimit: string | null;
      name: string;
      position: number;
      target: string | null;
      unit: string | null;
      upperLimit: string | null;
    };
    BatchCostDto: {
      /** @description What the batch still holds of work in progress. */
      held: components['schemas']['MoneyDto'];
      labour: components['schemas']['MoneyDto'];
      loss: components['schemas']['MoneyDto'];
      materialsIn: components['schemas']['MoneyDto'];
      materialsOut: components['schemas']['MoneyDto'];
    };
    BatchDocumentDto: {
      document: string;
    };
    BatchDto: {
      buildStartedAt: string | null;
      /** @description Not shown to assemblers. */
      cost?: components['schemas']['BatchCostDto'];
      createdAt: string;
      dueOn: string;
      /** @description Pieces that came onto the shelf. */
      finished: number;
      finishedAt: string | null;
      id: number;
      late: boolean;
      lines: components['schemas']['BatchLineDto'][];
      /** @description Lines of which the shelf does not hold enough. */
      linesShort: number;
      next: components['schemas']['NextActDto'];
      note: string | null;
      number: string;
      part: components['schemas']['BatchPartDto'];
      quantity: number;
      revision: number;
      scrapped: number;
      startOn: string | null;
      /** @enum {string} */
      status: 'done' | 'in_build' | 'picking' | 'planned' | 'withdrawn';
      steps: components['schemas']['BatchStepDto'][];
      subAssemblies: components['schemas']['BatchSubAssemblyDto'][];
      testPlan: components['schemas']['BatchCharacteristicDto'][];
      units: components['schemas']['StripUnitDto'][];
      version: number;
    };
    BatchInputDto: {
      /**
       * Format: date
       * @example 2027-02-28
       */
      dueOn: string;
      note?: string | null;
      /** @description What is built: a part with a released bill. */
      part: string;
      quantity: number;
      /**
       * Format: date
       * @example 2027-02-28
       */
      startOn?: string | null;
    };
    BatchItemDto: {
      dueOn: string;
      /** @description Pieces that came onto the shelf. */
      finished: number;
      id: number;
      late: boolean;
      /** @description Lines of which the shelf does not hold enough. */
      linesShort: number;
      next: components['schemas']['NextActDto'];
      number: string;
      part: components['schemas']['BatchPartDto'];
      quantity: number;
      revision: number;
      scrapped: number;
      startOn: string | null;
      /** @enum {string} */
      status: 'done' | 'in_build' | 'picking' | 'planned' | 'withdrawn';
      units: components['schemas']['StripUnitDto'][];
    };
    BatchLineDto: {
      /** @description Approved to stand in, the preferred one first. */
      alternates: components['schemas']['BatchPartDto'][];
      /** @description Claimed on the shelf for this line. */
      claimed: string;
      issued: string;
      marks: string | null;
      /** @description Needed, and neither issued nor claimed. */
      missing: string;
      part: components['schemas']['BatchPartDto'];
      path: string;
      quantityPer: string;
      required: string;
    };
    BatchPageDto: {
      items: components['schemas']['BatchItemDto'][];
      total: number;
    };
    BatchPartDto: {
      code: string;
      measure: string;
      name: string;
      traced: string;
    };
    BatchStepDto: {
      caution: string | null;
      /** @description Serial numbers of the units on which it is done. */
      doneOn: string[];
      instruction: string;
      /** @description Expected for one unit. */
      minutes: string;
      /** @description What the step makes: the batch's own part, or a sub-assembly built within it. */
      part: string;
      position: number;
      title: string;
    };
    BatchSubAssemblyDto: {
      fromShelf: boolean;
      part: components['schemas']['BatchPartDto'];
      path: string;
      required: string;
    };
    BillComparisonDto: {
      from: number;
      lines: components['schemas']['LineChangeDto'][];
      steps: components['schemas']['StepChangeDto'][];
      testPlan: components['schemas']['CharacteristicChangeDto'][];
      to: number;
    };
    BillCostDto: {
      labour: components['schemas']['MoneyDto'];
      labourPerHour: components['schemas']['MoneyDto'];
      lines: components['schemas']['CostLineDto'][];
      material: components['schemas']['MoneyDto'];
      minutes: string;
      /** @description Minutes of the bill's own steps, and on all levels. */
      ownMinutes: string;
      total: components['schemas']['MoneyDto'];
      /** @description Parts whose cost is not known and counts as nothing. */
      unknown: components['schemas']['BillPartDto'][];
    };
    BillDto: {
      draft: number | null;
      part: components['schemas']['BillPartDto'];
      released: number | null;
      /** @description The newest first. */
      revisions: components['schemas']['RevisionSummaryDto'][];
      usedIn: number;
    };
    BillEditDto: {
      lines: components['schemas']['BillLineInputDto'][];
      note?: string | null;
      steps: components['schemas']['BuildStepInputDto'][];
      testPlan: components['schemas']['CharacteristicInputDto'][];
      version: number;
    };
    BillLineDto: {
      alternates: components['schemas']['BillPartDto'][];
      /** @description Number of the released revision of the component's own bill, if it is made. */
      madeBy: number | null;
      marks: string | null;
      note: string | null;
      part: components['schemas']['BillPartDto'];
      position: number;
      quantityPer: string;
      scrapPercent: string;
    };
    BillLineInputDto: {
      /** @description Codes of the parts approved to stand in, the preferred one first. */
      alternates: string[];
      /** @description Position marks, such as R1 R2. */
      marks?: string | null;
      note?: string | null;
      /** @description The component's code. */
      part: string;
      /** @description Where the line stands; unique within the bill, and what the exploded drawing numbers it by. */
      position: number;
      /**
       * Format: decimal
       * @description In the component's stock unit, for one made.
       * @example 12.5
       */
      quantityPer: string;
      /** @description Share of what is taken that is normally lost, in percent. */
      scrapPercent: string;
    };
    BillListDto: {
      items: components['schemas']['BillListItemDto'][];
      total: number;
    };
    BillListItemDto: {
      code: string;
      draft: number | null;
      /** Format: date-time */
      draftedAt: string | null;
      draftVersion: number | null;
      /** @description Of the revision in force, or of the draft where there is none. */
      lines: number;
      measure: string;
      minutes: string;
      name: string;
      /** @description Number of the revision in force. */
      released: number | null;
      /** Format: date-time */
      releasedAt: string | null;
      retired: boolean;
      traced: string;
      /** @description Released bills that this part is in. */
      usedIn: number;
    };
    BillPartDto: {
      code: string;
      /** @description The stock unit. */
      measure: string;
      name: string;
      retired: boolean;
      traced: string;
    };
    BillRevisionDto: {
      /** Format: date-time */
      createdAt: string;
      createdBy: string | null;
      lines: components['schemas']['BillLineDto'][];
      /** @description Of all steps, for one made. */
      minutes: string;
      note: string | null;
      number: number;
      part: components['schemas']['BillPartDto'];
      /** Format: date-time */
      releasedAt: string | null;
      releasedBy: string | null;
      /** @enum {string} */
      status: 'draft' | 'released' | 'superseded';
      steps: components['schemas']['BuildStepDto'][];
      /** Format: date-time */
      supersededAt: string | null;
      testPlan: components['schemas']['CharacteristicDto'][];
      version: number;
    };
    BillTreeDto: {
      quantity: string;
      rows: components['schemas']['TreeRowDto'][];
      /** @description One row per part, summed over every place. */
      totals: components['schemas']['TreeTotalDto'][];
    };
    BinContentDto: {
      expiresOn: string | null;
      lot: string;
      lotStatus: string;
      measure: string;
      name: string;
      part: string;
      quantity: string;
      traced: string;
    };
    BinDto: {
      code: string;
      contents: components['schemas']['BinContentDto'][];
      id: number;
      name: string;
      /** @description What lies in a quarantine bin can be neither picked nor sold. */
      quarantine: boolean;
      retired: boolean;
      version: number;
    };
    BinEditDto: {
      code: string;
      name: string;
      /** @description What lies in a quarantine bin can be neither picked nor sold. */
      quarantine: boolean;
      version: number;
    };
    BinInputDto: {
      code: string;
      name: string;
      /** @description What lies in a quarantine bin can be neither picked nor sold. */
      quarantine: boolean;
    };
    BinItemDto: {
      code: string;
      id: number;
      lotCount: number;
      name: string;
      partCount: number;
      quarantine: boolean;
      retired: boolean;
    };
    BinPageDto: {
      items: components['schemas']['BinItemDto'][];
      total: number;
    };
    BinRetireDto: {
      version: number;
    };
    BuildableDto: {
      /** @description Of these, one alone would be enough, and how much of it. */
      aloneEnough: components['schemas']['MissingPartDto'][];
      /** @description The most that could be possible; equal to `quantity` unless the search was cut short. */
      atMost: string;
      made: components['schemas']['MadeOnTheWayDto'][];
      /** @description Whether less than `stops` would not do. */
      proven: boolean;
      /** @description How many can be built now from what is free. */
      quantity: string;
      /** @description Everything that is missing for the next one: all of these together let it be built. */
      stops: components['schemas']['MissingPartDto'][];
      takes: components['schemas']['TakenPartDto'][];
    };
    BuildStepDto: {
      caution: string | null;
      instruction: string;
      minutes: string;
      position: number;
      title: string;
    };
    BuildStepInputDto: {
      /** @description Shown wherever the step is done. */
      caution?: string | null;
      instruction: string;
      /** @description For one made. */
      minutes: string;
      title: string;
    };
    BuyerInvoiceDto: {
      gross: components['schemas']['MoneyDto'];
      id: number;
      issuedOn: string;
      /** @enum {string} */
      kind: 'credit_note' | 'invoice';
      number: string;
    };
    BuyerOrderDto: {
      addressLine: string;
      addressLine2: string | null;
      canPay: boolean;
      city: string;
      company: string | null;
      country: string;
      delivery: components['schemas']['MoneyDto'];
      events: components['schemas']['BuyerOrderEventDto'][];
      gross: components['schemas']['MoneyDto'];
      invoices: components['schemas']['BuyerInvoiceDto'][];
      lines: components['schemas']['BuyerOrderLineDto'][];
      net: components['schemas']['MoneyDto'];
      number: string;
      placedAt: string;
      postcode: string;
      /** @description The day it was promised to leave; it never changes. */
      promisedOn: string;
      recipient: string;
      /** @description Where it stands, in a sentence. */
      standing: string;
      units: components['schemas']['BuyerUnitDto'][];
      vat: components['schemas']['MoneyDto'];
      vatNote: string | null;
    };
    BuyerOrderEventDto: {
      /** @description ISO instant. */
      at: string;
      /** @description What happened, in a sentence. */
      what: string;
    };
    BuyerOrderLineDto: {
      net: components['schemas']['MoneyDto'];
      quantity: number;
      title: string;
      vatRate: string;
    };
    BuyerOrderRowDto: {
      gross: components['schemas']['MoneyDto'];
      number: string;
      placedAt: string;
      standing: string;
    };
    BuyerOrdersDto: {
      items: components['schemas']['BuyerOrderRowDto'][];
    };
    BuyerUnitDto: {
      /** @description Opens the unit's public page. */
      pageToken: string;
      serial: string;
    };
    CancellationDto: {
      /** @description The credit note, if the order was paid. */
      creditNote: string | null;
      order: string;
    };
    CancelOrderInput: {
      /** @description The order's number. */
      order: string;
      /** @description Stands in the credit note and in the buyer's mail. */
      reason: string;
    };
    CarrierAnswerInput: {
      /** @description Who was asked at the carrier, when, and what they said. */
      note: string;
      version: number;
    };
    CharacteristicChangeDto: {
      after: components['schemas']['CharacteristicDto'] | null;
      before: components['schemas']['CharacteristicDto'] | null;
      fields: string[];
      /** @enum {string} */
      kind: 'added' | 'changed' | 'removed';
    };
    CharacteristicDto: {
      caution: string | null;
      condition: string | null;
      digits: number | null;
      /** @enum {string} */
      kind: 'numeric' | 'yes_no';
      lowerLimit: string | null;
      name: string;
      position: number;
      target: string | null;
      unit: string | null;
      upperLimit: string | null;
    };
    CharacteristicInputDto: {
      /** @description Shown wherever the reading is taken. */
      caution?: string | null;
      /** @description What the reading is taken at, such as 30 s after switching on. */
      condition?: string | null;
      /** @description Decimals a reading is given with. */
      digits?: number | null;
      /** @enum {string} */
      kind: 'numeric' | 'yes_no';
      lowerLimit?: string | null;
      name: string;
      target?: string | null;
      unit?: string | null;
      upperLimit?: string | null;
    };
    CheckedOutDto: {
      /** @description Opens the order without signing in; given out once. */
      guestToken: string;
      number: string;
      /** @description Where to pay; null when the payments service did not answer. */
      paymentPage: string | null;
    };
    CheckoutDto: {
      addressLine: string;
      addressLine2?: string;
      city: string;
      company?: string;
      country: string;
      /** Format: email */
      email: string;
      /**
       * Format: date
       * @description The day the buyer was promised.
       * @example 2027-02-28
       */
      expectedDay: string;
      /** @description The total the buyer saw, in minor units. */
      expectedGross: number;
      lines: components['schemas']['BasketLineDto'][];
      postcode: string;
      recipient: string;
      /** @description The terms were read and accepted. */
      termsAccepted: boolean;
    };
    ClosedDayDto: {
      /**
       * Format: date
       * @example 2027-02-28
       */
      day: string;
      name: string;
    };
    ClosedDayInputDto: {
      /**
       * Format: date
       * @example 2027-02-28
       */
      day: string;
      name: string;
    };
    ClosedDaysDto: {
      items: components['schemas']['ClosedDayDto'][];
      total: number;
    };
    CompletionDto: {
      bin: string;
    };
    ComponentDto: {
      code: string;
      /** @description Whether it has a released bill of its own. */
      made: boolean;
      /** @description The stock unit. */
      measure: string;
      name: string;
      retired: boolean;
      traced: string;
      unitWeightG: string | null;
    };
    ComponentListDto: {
      items: components['schemas']['ComponentDto'][];
      total: number;
    };
    ContentsBagDto: {
      bag: string;
      lines: number;
      /** @description Codes of the parts in it whose weight is not known. */
      unweighed: string[];
      /** @description Sum of the weights that are known. */
      weightG: string;
    };
    ContentsDto: {
      /** @description In the order in which they first occur. */
      bags: components['schemas']['ContentsBagDto'][];
      lines: components['schemas']['ContentsLineDto'][];
      part: components['schemas']['BillPartDto'];
      unweighed: string[];
      /** @description 0 for a list that is not there yet. */
      version: number;
      /** @description Expected weight of everything together, as far as weights are known. */
      weightG: string;
    };
    ContentsEditDto: {
      lines: components['schemas']['ContentsLineInputDto'][];
      /** @description As read; 0 for a list that is not there yet. */
      version: number;
    };
    ContentsLineDto: {
      bag: string;
      /** @description Whether the part has a released bill of its own; otherwise it is bought. */
      made: boolean;
      part: components['schemas']['BillPartDto'];
      position: number;
      quantity: string;
      /** @description Of one stock unit. */
      unitWeightG: string | null;
      /** @description Of the line. */
      weightG: string | null;
    };
    ContentsLineInputDto: {
      /** @description Which bag it goes into. */
      bag: string;
      part: string;
      /**
       * Format: decimal
       * @example 12.5
       */
      quantity: string;
    };
    CostLineDto: {
      amount: components['schemas']['MoneyDto'];
      /**
       * @description Where the cost comes from: the average of what lies on the shelf, the last that came in, its own bill, or nowhere.
       * @enum {string}
       */
      basis: 'average' | 'bill' | 'last' | 'unknown';
      part: components['schemas']['BillPartDto'];
      position: number;
      /** @description Of the component, for one made, with its allowance for scrap; in its stock unit. */
      taken: string;
      /** @description For one stock unit of the component, in major units with six places. */
      unitCost: string | null;
    };
    CountriesDto: {
      items: components['schemas']['CountryDto'][];
      total: number;
    };
    CountryDto: {
      code: string;
      /** @description Whether its goods are inside the European Union's VAT area. */
      inUnion: boolean;
      name: string;
    };
    DeliveryDto: {
      deliveryNote: string | null;
      lineCount: number;
      lines: components['schemas']['DeliveryLineDto'][];
      note: string | null;
      number: string;
      occurredAt: string;
      receivedOn: string;
      recordedBy: string | null;
      /** @description The number of the document that reversed it. */
      reversedBy: string | null;
      supplier: string;
      supplierName: string;
      /** @description Not shown to assemblers. */
      value?: components['schemas']['MoneyDto'];
    };
    DeliveryInputDto: {
      deliveryNote?: string | null;
      lines: components['schemas']['DeliveryLineInputDto'][];
      note?: string | null;
      /**
       * Format: date
       * @example 2027-02-28
       */
      receivedOn: string;
      supplier: string;
    };
    DeliveryItemDto: {
      deliveryNote: string | null;
      lineCount: number;
      number: string;
      receivedOn: string;
      recordedBy: string | null;
      /** @description The number of the document that reversed it. */
      reversedBy: string | null;
      supplier: string;
      supplierName: string;
      /** @description Not shown to assemblers. */
      value?: components['schemas']['MoneyDto'];
    };
    DeliveryLineDto: {
      bin: string;
      expiresOn: string | null;
      lot: string;
      lotStatus: string;
      measure: string;
      name: string;
      part: string;
      quantity: string;
      supplierLot: string | null;
      /** @description Not shown to assemblers. */
      unitCost?: string;
      value?: components['schemas']['MoneyDto'];
    };
    DeliveryLineInputDto: {
      bin: string;
      /**
       * Format: date
       * @example 2027-02-28
       */
      expiresOn?: string | null;
      /** @description Kept back until somebody has looked at it; for parts followed by delivery. */
      held: boolean;
      /** @description Value of the whole line without VAT, in minor units of the shop's currency. */
      lineValueMinor?: number | null;
      part: string;
      /**
       * Format: decimal
       * @description In the part's stock unit.
       * @example 12.5
       */
      quantity: string;
      /** @description What the supplier calls the lot; for parts followed by delivery. */
      supplierLot?: string | null;
      /** @description Price of one stock unit without VAT, in the shop's currency; or give the value of the line. */
      unitPrice?: string | null;
    };
    DeliveryPageDto: {
      items: components['schemas']['DeliveryItemDto'][];
      total: number;
    };
    DeliveryRateDto: {
      carriesLithium: boolean;
      countryCode: string;
      id: number;
      net: components['schemas']['MoneyDto'];
      transitDays: number;
      validFrom: string;
    };
    DeliveryRateInputDto: {
      /** @description Whether parcels with lithium cells or batteries can go this way. */
      carriesLithium: boolean;
      countryCode: string;
      /** @description Net price, in minor units of the shop's currency. */
      netMinor: number;
      transitDays: number;
      /**
       * Format: date
       * @example 2027-02-28
       */
      validFrom: string;
    };
    DeliveryRatesDto: {
      items: components['schemas']['DeliveryRateDto'][];
      total: number;
    };
    DesignQueueDto: {
      items: components['schemas']['DesignQueueItemDto'][];
    };
    DesignQueueItemDto: {
      /** @description For a draft: what stands against releasing it, a sentence each. */
      against: string[];
      /** @enum {string} */
      kind: 'cannot_build' | 'component_retired' | 'draft_waiting';
      number: number;
      part: components['schemas']['BillPartDto'];
      /** @description Codes of the parts it is about: retired or missing ones. */
      parts: string[];
      /**
       * Format: date-time
       * @description Since when: the draft was begun or the revision released.
       */
      since: string;
    };
    DispatchInput: {
      carrier: string;
      trackingCode: string | null;
      version: number;
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
      | 'already_exists'
      | 'changed_meanwhile'
      | 'invalid_input'
      | 'key_reused'
      | 'link_expired'
      | 'not_allowed'
      | 'not_enough_stock'
      | 'not_found'
      | 'not_signed_in'
      | 'rule_broken'
      | 'service_unavailable'
      | 'stale_form'
      | 'too_large'
      | 'too_many_tries'
      | 'unexpected'
      | 'unsupported_media'
      | 'wrong_credentials'
      | 'wrong_state';
    ExpiringLotDto: {
      expired: boolean;
      expiresOn: string;
      lot: string;
      measure: string;
      name: string;
      part: string;
      quantity: string;
    };
    ExportTotalsDto: {
      credit: components['schemas']['MoneyDto'];
      creditNotes: number;
      debit: components['schemas']['MoneyDto'];
      entries: number;
      from: string;
      gross: components['schemas']['MoneyDto'];
      invoices: number;
      lines: number;
      /** @description Invoices less credit notes. */
      net: components['schemas']['MoneyDto'];
      to: string;
      vat: components['schemas']['MoneyDto'];
    };
    FaultDto: {
      action: string | null;
      batch: string;
      cause: string | null;
      closedAt: string | null;
      foundAt: string;
      foundBy: string | null;
      id: number;
      number: string;
      /** @enum {string|null} */
      outcome: 'no_fault' | 'reworked' | 'scrapped' | null;
      part: string;
      partName: string;
      /** @description The run that failed, if a measurement found it. */
      run: number | null;
      serial: string;
      step: string | null;
      version: number;
      what: string;
    };
    FaultInputDto: {
      /** @description At which step of the batch it was seen. */
      step?: number | null;
      /** @description What is wrong. */
      what: string;
    };
    FaultPageDto: {
      items: components['schemas']['FaultDto'][];
      total: number;
    };
    FieldFaultDto: {
      code: string;
      detail: string;
      /** @description JSON pointer to the field, such as `/lines/0/quantity`. */
      pointer: string;
    };
    FileColumnDto: {
      header: string;
      /** @description Its place in the file, from 0. */
      index: number;
      /** @description The key of the column it fills; null when it is left alone. */
      key: string | null;
      /** @description The first value in it. */
      sample: string;
      title: string | null;
    };
    FinishedUnitDto: {
      document: string;
      lot: string;
      serial: string;
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
    FirstPassDto: {
      /** @description Units whose first complete run is known. */
      measured: number;
      name: string;
      part: string;
      /** @description Of them, how many passed it. */
      passed: number;
    };
    FirstPassListDto: {
      items: components['schemas']['FirstPassDto'][];
    };
    FittedLotDto: {
      /** @description A lot that was picked for this line. */
      lot: string;
      path: string;
      /**
       * Format: decimal
       * @description In one unit; left out, all that the bill asks for.
       * @example 12.5
       */
      quantity?: string | null;
    };
    FoundDto: {
      /** @description What stands on its tag. */
      code: string;
      /** @description Whether its code is the very one asked for. */
      exact: boolean;
      /** @enum {string} */
      kind: 'batch' | 'bin' | 'document' | 'invoice' | 'lot' | 'order' | 'part' | 'person' | 'supplier' | 'unit';
      /** @description One line about it. */
      story: string;
      /** @description Where it lives, if not at the address of its kind. */
      to?: string;
    };
    FoundListDto: {
      items: components['schemas']['FoundDto'][];
      total: number;
    };
    HealthDto: {
      /** @enum {string} */
      status: 'ok';
    };
    HeldLotDto: {
      bins: string[];
      lot: string;
      measure: string;
      name: string;
      part: string;
      quantity: string;
      receivedOn: string | null;
      supplier: string | null;
    };
    ImportCheckDto: {
      additions: number;
      columns: components['schemas']['FileColumnDto'][];
      /** @enum {string|null} */
      decimalSign: 'comma' | 'point' | null;
      /** @description All of them are counted; the first thousand are listed. */
      faultCount: number;
      faults: components['schemas']['RowFaultDto'][];
      fileName: string;
      kind: string;
      /** @description What would be added, and what is there already. */
      notes: string[];
      /** @description Whether it can be applied: no fault, and something to add. */
      ready: boolean;
      rowCount: number;
      /** @description What cuts the file into cells. */
      separator: string;
    };
    ImportColumnDto: {
      key: string;
      required: boolean;
      /** @description What belongs there. */
      sentence: string;
      title: string;
    };
    ImportKindDto: {
      columns: components['schemas']['ImportColumnDto'][];
      kind: string;
      sentence: string;
      title: string;
    };
    ImportKindsDto: {
      items: components['schemas']['ImportKindDto'][];
      total: number;
    };
    ImportRunDto: {
      appliedAt: string;
      appliedBy: string;
      /** @description The document that carries what was taken in. */
      document: string | null;
      fileName: string;
      id: number;
      kind: string;
      rowCount: number;
      title: string;
    };
    ImportRunPageDto: {
      items: components['schemas']['ImportRunDto'][];
      total: number;
    };
    InvitationDto: {
      /** Format: email */
      email: string;
      name: string;
      /** @enum {string} */
      role: 'accountant' | 'assembler' | 'owner';
    };
    InvoiceChargeDto: {
      amount: components['schemas']['MoneyDto'];
      reason: string;
      vatRate: string;
    };
    InvoiceDto: {
      buyer: string;
      buyerParty: components['schemas']['InvoicePartyDto'];
      charges: components['schemas']['InvoiceChargeDto'][];
      country: string;
      creditedBy: string[];
      /** @description Of a credit note: the invoice it takes back. */
      creditsNumber: string | null;
      gross: components['schemas']['MoneyDto'];
      issuedOn: string;
      kind: components['schemas']['InvoiceKind'];
      lines: components['schemas']['InvoiceLineDto'][];
      net: components['schemas']['MoneyDto'];
      /** @description What stands under the totals. */
      notes: string[];
      number: string;
      prepaid: components['schemas']['MoneyDto'];
      reason: string | null;
      /** @description The order's number. */
      reference: string;
      seller: components['schemas']['InvoicePartyDto'];
      taxPoint: string;
      vat: components['schemas']['MoneyDto'];
      vatGroups: components['schemas']['InvoiceVatDto'][];
    };
    /** @enum {string} */
    InvoiceKind: 'credit_note' | 'invoice';
    InvoiceLineDto: {
      code: string;
      description: string;
      measure: string;
      net: components['schemas']['MoneyDto'];
      quantity: string;
      /** @description Major units, decimal text. */
      unitNet: string;
      vatRate: string;
    };
    InvoicePageDto: {
      items: components['schemas']['InvoiceRowDto'][];
      total: number;
    };
    InvoicePartyDto: {
      addressLine: string;
      addressLine2: string | null;
      city: string;
      countryCode: string;
      name: string;
      postcode: string;
      vatNumber: string | null;
    };
    InvoiceRowDto: {
      buyer: string;
      country: string;
      /** @description Of a credit note: the invoice it takes back. */
      creditsNumber: string | null;
      gross: components['schemas']['MoneyDto'];
      issuedOn: string;
      kind: components['schemas']['InvoiceKind'];
      net: components['schemas']['MoneyDto'];
      number: string;
      /** @description The order's number. */
      reference: string;
      vat: components['schemas']['MoneyDto'];
    };
    InvoiceVatDto: {
      amount: components['schemas']['MoneyDto'];
      category: string;
      rate: string;
      taxable: components['schemas']['MoneyDto'];
    };
    IssueInputDto: {
      lines: components['schemas']['IssueLineDto'][];
    };
    IssueLineDto: {
      bin: string;
      /** @description Not needed for a part followed by count. */
      lot?: string | null;
      /** @description The line's own part, or one approved to stand in for it. */
      part: string;
      /** @description The place of the component in the bill: which line of the batch it is for. */
      path: string;
      /**
       * Format: decimal
       * @example 12.5
       */
      quantity: string;
    };
    JournalEntryDto: {
      day: string;
      document: string;
      documentKind: string;
      event: string;
      id: number;
      lines: components['schemas']['JournalLineDto'][];
      narrative: string;
      total: components['schemas']['MoneyDto'];
    };
    JournalLineDto: {
      account: string;
      accountName: string;
      credit: components['schemas']['MoneyDto'] | null;
      debit: components['schemas']['MoneyDto'] | null;
    };
    JournalPageDto: {
      items: components['schemas']['JournalEntryDto'][];
      total: number;
    };
    KitListDto: {
      items: components['schemas']['KitListItemDto'][];
      total: number;
    };
    KitListItemDto: {
      bags: number;
      code: string;
      lines: number;
      name: string;
      retired: boolean;
      /** @description Parts whose weight is not known. */
      unweighed: number;
      weightG: string;
    };
    KitUseDto: {
      bag: string;
      part: components['schemas']['BillPartDto'];
      quantity: string;
      /** @description What of it, or of what it is in, lies in the kit. */
      through: string;
    };
    LineChangeDto: {
      after: components['schemas']['BillLineDto'] | null;
      before: components['schemas']['BillLineDto'] | null;
      /** @description Which fields differ. */
      fields: string[];
      /** @enum {string} */
      kind: 'added' | 'changed' | 'removed';
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
    LithiumInput: {
      /** @description Charge of the batteries in percent of their rated capacity; asked for where they fly. */
      chargePercent: number | null;
      /** @enum {string} */
      mode: 'cargo_aircraft' | 'letter_post' | 'passenger_aircraft' | 'road' | 'sea';
      version: number;
      /** @description Whether the watt-hours stand on the outside of each battery. */
      wattHoursOnCase: boolean | null;
      /** @description The whole parcel, weighed. */
      weightG: number;
    };
    LithiumRuleDto: {
      instruction: string;
      properName: string;
      rule: string;
      unNumber: string;
    };
    LotBatchDto: {
      number: string;
      part: string;
      quantity: string;
    };
    LotDto: {
      /** @description Which batches took of it. */
      batches: components['schemas']['LotBatchDto'][];
      bins: string[];
      code: string;
      currency?: string;
      expired: boolean;
      expiresOn: string | null;
      kind: string;
      measure: string;
      moves: components['schemas']['MoveDto'][];
      name: string;
      note: string | null;
      /** @description The document that brought it, and what kind that is. */
      origin: string | null;
      originKind: string | null;
      part: string;
      places: components['schemas']['LotPlaceDto'][];
      /** @description What of it lies on the shelf, over all bins. */
      quantity: string;
      receivedOn: string | null;
      /** @enum {string} */
      status: 'held' | 'rejected' | 'released';
      statusChanges: components['schemas']['LotStatusChangeDto'][];
      supplier: string | null;
      supplierLot: string | null;
      /** @description What one unit cost when it came. Not shown to assemblers. */
      unitCost?: string;
      version: number;
    };
    LotItemDto: {
      bins: string[];
      code: string;
      expired: boolean;
      expiresOn: string | null;
      kind: string;
      measure: string;
      name: string;
      part: string;
      /** @description What of it lies on the shelf, over all bins. */
      quantity: string;
      receivedOn: string | null;
      /** @enum {string} */
      status: 'held' | 'rejected' | 'released';
      supplier: string | null;
      supplierLot: string | null;
    };
    LotPageDto: {
      items: components['schemas']['LotItemDto'][];
      total: number;
    };
    LotPlaceDto: {
      bin: string;
      quantity: string;
      quarantine: boolean;
    };
    LotStatusChangeDto: {
      document: string;
      from: string;
      occurredAt: string;
      person: string | null;
      reason: string;
      to: string;
    };
    LotStatusInputDto: {
      /** @description Why, for whoever asks later. */
      reason: string;
      /** @enum {string} */
      status: 'held' | 'rejected' | 'released';
      version: number;
    };
    MadeOnTheWayDto: {
      part: components['schemas']['BillPartDto'];
      quantity: string;
    };
    MadePiecesDto: {
      bin: string;
      /** @description Nothing more comes of this batch: what is missing is lost. */
      last: boolean;
      quantity: number;
    };
    /** @enum {string} */
    MailState: 'given_up' | 'sent' | 'uncertain' | 'waiting';
    MissingPartDto: {
      claimed: string;
      /** @description How much of it is missing. */
      missing: string;
      /** @description What lies on the shelf, what of it may be used, and what of that is promised already. */
      onShelf: string;
      part: components['schemas']['BillPartDto'];
      usable: string;
    };
    MoneyDto: {
      /** @description In minor units: 1250 is 12.50 in a currency with two decimals. */
      amount: number;
      currency: string;
    };
    MonthDto: {
      closedAt: string | null;
      closedBy: string | null;
      entries: number;
      /** @description `2027-03` */
      month: string;
    };
    MonthsDto: {
      items: components['schemas']['MonthDto'][];
    };
    MoveDto: {
      bin: string;
      document: string;
      documentKind: string;
      id: number;
      lot: string;
      measure: string;
      /** @description The document's note. */
      note: string | null;
      occurredAt: string;
      part: string;
      person: string | null;
      /** @description Signed: above zero in, below zero out. */
      quantity: string;
      reason: string;
      /** @description Whether the document can still be reversed from here: it is a delivery, transfer or adjustment, and was not. */
      reversible: boolean;
      /** @description Not shown to assemblers. */
      value?: components['schemas']['MoneyDto'];
    };
    MovePageDto: {
      items: components['schemas']['MoveDto'][];
      total: number;
    };
    NamedSupplierDto: {
      leadTimeDays?: number | null;
      name: string;
      /** @description The one to order from first; at most one of a part's suppliers. */
      preferred: boolean;
      /** @description The supplier's code. */
      supplier: string;
      supplierPartCode?: string | null;
    };
    NewDraftDto: {
      /**
       * @description `released` copies the revision in force; `nothing` begins an empty one.
       * @enum {string}
       */
      from: 'nothing' | 'released';
    };
    NextActDto: {
      /** @description Names the act for a program: `claim`, `pick`, `start_building`, `build`, `none`. */
      act: string;
      sentence: string;
    };
    NoFaultInputDto: {
      /** @description Why it is none. */
      reason: string;
      version: number;
    };
    OpenParcelInput: {
      /** @description The order's number. */
      order: string;
    };
    OrderDeskDocumentDto: {
      at: string;
      kind: string;
      number: string;
      /** @description What happened, in a sentence. */
      sentence: string;
    };
    OrderDeskDto: {
      address: string[];
      /** @description Whether it may still be cancelled. */
      cancellable: boolean;
      country: string;
      delivery: components['schemas']['MoneyDto'] | null;
      documents: components['schemas']['OrderDeskDocumentDto'][];
      email: string;
      /** @description Null for who works without prices. */
      gross: components['schemas']['MoneyDto'] | null;
      /** @description The promised day has passed and the order is still here. */
      late: boolean;
      lines: components['schemas']['OrderDeskLineDto'][];
      net: components['schemas']['MoneyDto'] | null;
      number: string;
      /** @description The open parcel. */
      parcel: string | null;
      placedAt: string;
      promisedOn: string;
      recipient: string;
      reviews: components['schemas']['OrderDeskReviewDto'][];
      /** @description Where it is, in a sentence. */
      sentence: string;
      state: components['schemas']['OrderState'];
      vat: components['schemas']['MoneyDto'] | null;
      vatNote: string | null;
    };
    OrderDeskLineDto: {
      form: string;
      needs: components['schemas']['OrderDeskNeedDto'][];
      net: components['schemas']['MoneyDto'] | null;
      part: string;
      quantity: number;
      title: string;
    };
    OrderDeskNeedDto: {
      bag: string | null;
      /** @description Batches that it waits for. */
      batches: string[];
      /** @description Claimed on the shelf. */
      fromShelf: string;
      measure: string;
      part: string;
      partName: string;
      quantity: string;
      /** @description Neither on the shelf nor to come. */
      short: string;
    };
    OrderDeskPageDto: {
      items: components['schemas']['OrderDeskRowDto'][];
      total: number;
    };
    OrderDeskReviewDto: {
      createdAt: string;
      id: number;
      resolution: string | null;
      what: string;
    };
    OrderDeskRowDto: {
      country: string;
      /** @description Null for who works without prices. */
      gross: components['schemas']['MoneyDto'] | null;
      /** @description The promised day has passed and the order is still here. */
      late: boolean;
      number: string;
      /** @description The open parcel. */
      parcel: string | null;
      placedAt: string;
      promisedOn: string;
      recipient: string;
      /** @description Where it is, in a sentence. */
      sentence: string;
      state: components['schemas']['OrderState'];
    };
    /** @enum {string} */
    OrderState:
      'building' | 'cancelled' | 'packed' | 'packing' | 'paying' | 'ready' | 'review' | 'shipped' | 'short' | 'unpaid';
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
    PackedItemDto: {
      bin: string;
      id: number;
      lot: string;
      needId: number;
      packedAt: string;
      part: string;
      quantity: string;
      serial: string | null;
    };
    ParcelDto: {
      address: string[];
      carrier: string | null;
      /** @description Cautions that go with what is in it. */
      cautions: string[];
      country: string;
      items: components['schemas']['PackedItemDto'][];
      lithium: components['schemas']['ParcelLithiumDto'];
      needs: components['schemas']['ParcelNeedDto'][];
      number: string;
      openedAt: string;
      order: string;
      promisedOn: string;
      recipient: string;
      shippedAt: string | null;
      state: components['schemas']['ParcelState'];
      trackingCode: string | null;
      version: number;
      weightG: number | null;
    };
    ParcelLithiumDto: {
      answer: string;
      /** @description What the carrier answered, and who wrote it down. */
      carrierAnswer: string | null;
      caution: string;
      chargePercent: number | null;
      conditions: string[];
      edition: string | null;
      labels: string[];
      mark: string | null;
      mayLeave: boolean;
      missing: string[];
      mode: components['schemas']['ParcelMode'] | null;
      papers: string[];
      reasons: string[];
      rules: components['schemas']['LithiumRuleDto'][];
      /** @description The answer in a sentence. */
      sentence: string;
      wattHoursOnCase: boolean | null;
    };
    /** @enum {string} */
    ParcelMode: 'cargo_aircraft' | 'letter_post' | 'passenger_aircraft' | 'road' | 'sea';
    ParcelNeedDto: {
      bag: string | null;
      id: number;
      measure: string;
      packed: string;
      part: string;
      partName: string;
      /** @description Where it lies, the lot to take first in front. */
      places: components['schemas']['ParcelPlaceDto'][];
      quantity: string;
      /** @description What was ordered: the tool, or the kit that this is part of. */
      title: string;
      traced: string;
    };
    ParcelPageDto: {
      items: components['schemas']['ParcelRowDto'][];
      total: number;
    };
    ParcelPlaceDto: {
      bin: string;
      lot: string;
      quantity: string;
    };
    ParcelRowDto: {
      carrier: string | null;
      country: string;
      number: string;
      openedAt: string;
      order: string;
      promisedOn: string;
      recipient: string;
      shippedAt: string | null;
      state: components['schemas']['ParcelState'];
      trackingCode: string | null;
    };
    /** @enum {string} */
    ParcelState: 'dissolved' | 'packed' | 'packing' | 'shipped';
    ParcelVersionInput: {
      version: number;
    };
    PartBatteryDto: {
      cellCount?: number | null;
      /** @enum {string} */
      chemistry: 'lithium_ion' | 'lithium_metal';
      /** @enum {string} */
      kind: 'battery' | 'cell';
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
    PartClaimDto: {
      /** @description What of that is to come out of a batch. */
      awaited: string;
      /** @description What of that it holds on the shelf. */
      claimed: string;
      kind: string;
      /** @description What of that it holds nowhere. */
      missing: string;
      /** @description What it still needs. */
      needed: string;
      neededOn: string | null;
      /** @description The number of the order or batch. */
      reference: string;
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
      measure: 'g' | 'kg' | 'l' | 'm' | 'ml' | 'mm' | 'pair' | 'piece' | 'set';
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
      suppliers: components['schemas']['NamedSupplierDto'][];
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
      measure: 'g' | 'kg' | 'l' | 'm' | 'ml' | 'mm' | 'pair' | 'piece' | 'set';
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
    PartFiguresDto: {
      /** @description In major units per stock unit. Not shown to assemblers. */
      averageCost?: string | null;
      belowReorderPoint: boolean;
      claimed: string;
      /** @description Usable and claimed by nobody; below zero when supply shrank under its claims. */
      free: string;
      /** @description Of that, what is held back. */
      held: string;
      /** @description How many days the free quantity lasts at the pace of the last 90 days; null without use. */
      lastsDays: number | null;
      /** @description All that lies on the shelf. */
      onShelf: string;
      /** @description By how much more is claimed than can be used; null when nothing is missing. */
      short: string | null;
      /** @description Of that, what may be issued: released, not expired, in no quarantine bin. */
      usable: string;
      value?: components['schemas']['MoneyDto'];
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
      measure: 'g' | 'kg' | 'l' | 'm' | 'ml' | 'mm' | 'pair' | 'piece' | 'set';
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
    PartItemDto: {
      /** @description In major units per stock unit. Not shown to assemblers. */
      averageCost?: string | null;
      belowReorderPoint: boolean;
      bins: string[];
      claimed: string;
      code: string;
      /** @description Usable and claimed by nobody; below zero when supply shrank under its claims. */
      free: string;
      /** @description Of that, what is held back. */
      held: string;
      /** @description How many days the free quantity lasts at the pace of the last 90 days; null without use. */
      lastsDays: number | null;
      measure: string;
      name: string;
      /** @description All that lies on the shelf. */
      onShelf: string;
      reorderPoint: string | null;
      retired: boolean;
      /** @description By how much more is claimed than can be used; null when nothing is missing. */
      short: string | null;
      traced: string;
      /** @description Of that, what may be issued: released, not expired, in no quarantine bin. */
      usable: string;
      value?: components['schemas']['MoneyDto'];
    };
    PartPageDto: {
      items: components['schemas']['PartItemDto'][];
      total: number;
    };
    PartParameterDto: {
      name: string;
      /** @description Of a number: its unit. */
      unit?: string | null;
      /** @description A decimal number, or a word. */
      value: string;
    };
    PartPlaceDto: {
      bin: string;
      expired: boolean;
      expiresOn: string | null;
      kind: string;
      lot: string;
      quantity: string;
      quarantine: boolean;
      receivedOn: string | null;
      status: string;
      supplier: string | null;
      supplierLot: string | null;
    };
    PartRetireDto: {
      version: number;
    };
    PartStoryDto: {
      claims: components['schemas']['PartClaimDto'][];
      /** @description Of the average cost; not shown to assemblers. */
      currency?: string;
      figures: components['schemas']['PartFiguresDto'];
      /** @description The latest, newest first. */
      moves: components['schemas']['MoveDto'][];
      part: components['schemas']['PartDto'];
      places: components['schemas']['PartPlaceDto'][];
      uses: components['schemas']['PartUseDto'][];
    };
    PartSupplierDto: {
      leadTimeDays?: number | null;
      /** @description The one to order from first; at most one of a part's suppliers. */
      preferred: boolean;
      /** @description The supplier's code. */
      supplier: string;
      supplierPartCode?: string | null;
    };
    PartUseDto: {
      name: string;
      part: string;
      quantity: string;
      revision: number | null;
      /** @description component: a line of the bill; alternate: may stand in; contents: lies in a kit. */
      role: string;
      status: string | null;
    };
    PasswordChangeDto: {
      /** Format: password */
      currentPassword: string;
      /** Format: password */
      newPassword: string;
    };
    PaymentPageDto: {
      /** @description Null when the payments service did not answer. */
      paymentPage: string | null;
    };
    PersonDto: {
      email: string;
      id: number;
      name: string;
      role: components['schemas']['Role'];
    };
    PickedDto: {
      /** @description Where it was taken from last. */
      bin: string;
      lot: string | null;
      part: components['schemas']['BatchPartDto'];
      path: string;
      quantity: string;
    };
    PickListDto: {
      number: string;
      picked: components['schemas']['PickedDto'][];
      rows: components['schemas']['PickRowDto'][];
      shortages: components['schemas']['PickShortageDto'][];
    };
    PickRowDto: {
      bin: string;
      /** @description Null for a part followed by count. */
      lot: string | null;
      marks: string | null;
      part: components['schemas']['BatchPartDto'];
      path: string;
      quantity: string;
      /** @description The part of the bill, where this one stands in for it. */
      standsInFor: string | null;
    };
    PickShortageDto: {
      part: components['schemas']['BatchPartDto'];
      path: string;
      quantity: string;
    };
    PostingRuleDto: {
      component: string;
      creditAccount: string;
      creditName: string;
      debitAccount: string;
      debitName: string;
      event: string;
      sentence: string;
    };
    PostingRulesDto: {
      items: components['schemas']['PostingRuleDto'][];
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
    PublicReadingDto: {
      answer: boolean | null;
      lowerLimit: string | null;
      name: string;
      reading: string | null;
      unit: string | null;
      upperLimit: string | null;
      within: boolean;
    };
    PublicUnitDto: {
      batchSize: number;
      builtWeek: number;
      /** @description ISO year and week in which it was begun. */
      builtYear: number;
      cautions: string[];
      measuredOn: string | null;
      name: string;
      readings: components['schemas']['PublicReadingDto'][];
      revision: number;
      serial: string;
      shop: string;
      /** @description Whether its last measurement passed and nothing was found wrong with it since. */
      sound: boolean;
      /** @description Counted from the day it left the shop; null while it has not. */
      warrantyUntil: string | null;
    };
    QuotedLineDto: {
      form: string;
      listingId: number;
      net: components['schemas']['MoneyDto'];
      quantity: number;
      slug: string;
      title: string;
      unitGross: components['schemas']['MoneyDto'];
      unitNet: components['schemas']['MoneyDto'];
    };
    QuoteDto: {
      /** @description Null when it can be ordered. */
      ask: string | null;
      delivery: components['schemas']['MoneyDto'] | null;
      gross: components['schemas']['MoneyDto'] | null;
      lines: components['schemas']['QuotedLineDto'][];
      net: components['schemas']['MoneyDto'] | null;
      promise: components['schemas']['ShopPromiseDto'] | null;
      /** @description Working days on the way, as a guide. */
      transitDays: number | null;
      vat: components['schemas']['MoneyDto'] | null;
      vatCountry: string | null;
      vatNote: string | null;
      vatRate: string | null;
    };
    ReadingInputDto: {
      /** @description Of a yes-or-no characteristic. */
      answer?: boolean | null;
      /**
       * Format: uuid
       * @description Made afresh for each reading: sent again with the same one, it is applied once.
       */
      clientKey: string;
      /** @description The person looked again at a reading that seemed to have slipped by a factor, and it stands. */
      confirmed?: boolean;
      /** @description When it was measured, by the device it was typed on. */
      measuredAt: string;
      /** @description Which characteristic of the test plan, by its position. */
      position: number;
      /** @description Of a measured characteristic: the number with a point, in its unit, with every digit that the instrument gives. */
      reading?: string | null;
      /** @description The run it was measured for: the one under way, or the one after the last. */
      run: number;
    };
    ReadingResultDto: {
      /** @description The fault that the run opened, if it failed. */
      fault: string | null;
      run: number;
      /** @enum {string|null} */
      runVerdict: 'fail' | 'pass' | null;
      /** @enum {string} */
      verdict: 'outside' | 'within';
    };
    ReceivedPaymentDto: {
      amount: components['schemas']['MoneyDto'];
      document: string;
      invoice: string | null;
      order: string;
      providerPaymentId: string;
      receivedAt: string;
      refunded: components['schemas']['MoneyDto'];
      refundState: string | null;
    };
    ReceivedPaymentsDto: {
      /** @description What the card processor holds by the books: payments less fees and refunds. */
      clearing: components['schemas']['MoneyDto'];
      items: components['schemas']['ReceivedPaymentDto'][];
      total: number;
    };
    ReopenMonthInput: {
      reason: string;
    };
    ReversalInputDto: {
      /** @description Why it was wrong. */
      reason: string;
    };
    RevisionSummaryDto: {
      /** Format: date-time */
      createdAt: string;
      createdBy: string | null;
      lines: number;
      note: string | null;
      number: number;
      /** Format: date-time */
      releasedAt: string | null;
      releasedBy: string | null;
      /** @enum {string} */
      status: 'draft' | 'released' | 'superseded';
      /** Format: date-time */
      supersededAt: string | null;
      version: number;
    };
    RevisionVersionDto: {
      version: number;
    };
    ReworkInputDto: {
      /** @description What was done about it. */
      action: string;
      /** @description Why it was so. */
      cause: string;
      /** @description Time at the bench. */
      minutes: string;
      version: number;
    };
    /** @enum {string} */
    Role: 'accountant' | 'assembler' | 'customer' | 'owner';
    RowFaultDto: {
      column: string | null;
      /** @description In the file; the header is line 1. */
      line: number;
      sentence: string;
    };
    RunReadingDto: {
      answer: boolean | null;
      /** @enum {string} */
      kind: 'numeric' | 'yes_no';
      /** @description The limits it was judged by. */
      lowerLimit: string | null;
      measuredAt: string;
      name: string;
      position: number;
      /** @description As it was typed. */
      reading: string | null;
      recordedBy: string;
      /** @description Whether a later reading took its place. */
      replaced: boolean;
      unit: string | null;
      upperLimit: string | null;
      /** @enum {string} */
      verdict: 'outside' | 'within';
    };
    ScanAnswerDto: {
      /** @description The bin that was scanned, to be sent with the next scan. */
      bin: string | null;
      parcel: components['schemas']['ParcelDto'];
      /** @description In a sentence, to be read out. */
      sentence: string;
    };
    ScanInput: {
      /** @description The bin that was scanned before, where the thing lies in several. */
      bin?: string;
      /** @description What was scanned or typed: a serial number, a lot, a part, a bin, or the address on a unit's label. */
      code: string;
      /** @description The line of the contents that it is for; the next open one of the part when nothing is said. */
      needId?: number;
      /**
       * Format: decimal
       * @description How much of a lot; all that is still missing when nothing is said.
       * @example 12.5
       */
      quantity?: string;
    };
    ScrapDto: {
      reason: string;
    };
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
    SettleReviewInput: {
      /** @description What was found and done. */
      resolution: string;
    };
    ShelfQueueDto: {
      expiringLotCount: number;
      expiringLots: components['schemas']['ExpiringLotDto'][];
      heldLotCount: number;
      heldLots: components['schemas']['HeldLotDto'][];
      shortPartCount: number;
      /** @description Claimed beyond what can be used first, then below the reorder point. */
      shortParts: components['schemas']['ShortPartDto'][];
    };
    ShopAnswerDto: {
      /** @description Null until the owner has set the shop up. */
      shop: components['schemas']['ShopDto'] | null;
      /** @description The zone of the shop's days, which is set where the server is started. */
      zone: string;
    };
    ShopContentDto: {
      bag: string;
      measure: string;
      name: string;
      quantity: string;
    };
    ShopCountryDto: {
      code: string;
      name: string;
    };
    ShopDto: {
      addressLine: string;
      bankName?: string | null;
      /** @description How long goods stay claimed for a buyer on the payment page. */
      checkoutHoldMinutes: number;
      city: string;
      countryCode: string;
      /** @description Of the books; it stays once something is posted. */
      currency: string;
      /** @description Whether the currency stays, because something is posted in it. */
      currencyStays: boolean;
      /** Format: email */
      email: string;
      /** @description Working days from an order to its parcel. */
      handlingDays: number;
      iban?: string | null;
      /** @description Cost of an hour at the bench, in minor units. */
      labourRateMinor: number;
      /** @description As it stands on invoices. */
      legalName: string;
      /** @description As customers know it. */
      name: string;
      /**
       * Format: date
       * @description First day on which destination VAT is charged to consumers elsewhere in the union; null: not elected.
       * @example 2027-02-28
       */
      oneStopShopFrom?: string | null;
      phone?: string | null;
      postcode: string;
      registrationNumber?: string | null;
      vatNumber?: string | null;
      version: number;
      warrantyMonths: number;
      /** @description ISO weekdays on which the shop works: Monday 1 to Sunday 7. */
      workingWeekdays: number[];
      /** @description The zone of its days, set where the server is started. */
      zone: string;
    };
    ShopEditDto: {
      addressLine: string;
      bankName?: string | null;
      /** @description How long goods stay claimed for a buyer on the payment page. */
      checkoutHoldMinutes: number;
      city: string;
      countryCode: string;
      /** @description Of the books; it stays once something is posted. */
      currency: string;
      /** Format: email */
      email: string;
      /** @description Working days from an order to its parcel. */
      handlingDays: number;
      iban?: string | null;
      /** @description Cost of an hour at the bench, in minor units. */
      labourRateMinor: number;
      /** @description As it stands on invoices. */
      legalName: string;
      /** @description As customers know it. */
      name: string;
      /**
       * Format: date
       * @description First day on which destination VAT is charged to consumers elsewhere in the union; null: not elected.
       * @example 2027-02-28
       */
      oneStopShopFrom?: string | null;
      phone?: string | null;
      postcode: string;
      registrationNumber?: string | null;
      vatNumber?: string | null;
      version: number;
      warrantyMonths: number;
      /** @description ISO weekdays on which the shop works: Monday 1 to Sunday 7. */
      workingWeekdays: number[];
    };
    ShopFrontDto: {
      addressLine: string;
      city: string;
      /** @description Countries the shop delivers to, by name. */
      countries: components['schemas']['ShopCountryDto'][];
      country: string;
      email: string;
      legalName: string;
      name: string;
      phone: string | null;
      postcode: string;
      registrationNumber: string | null;
      vatNumber: string | null;
      warrantyMonths: number;
    };
    ShopInputDto: {
      addressLine: string;
      bankName?: string | null;
      /** @description How long goods stay claimed for a buyer on the payment page. */
      checkoutHoldMinutes: number;
      city: string;
      countryCode: string;
      /** @description Of the books; it stays once something is posted. */
      currency: string;
      /** Format: email */
      email: string;
      /** @description Working days from an order to its parcel. */
      handlingDays: number;
      iban?: string | null;
      /** @description Cost of an hour at the bench, in minor units. */
      labourRateMinor: number;
      /** @description As it stands on invoices. */
      legalName: string;
      /** @description As customers know it. */
      name: string;
      /**
       * Format: date
       * @description First day on which destination VAT is charged to consumers elsewhere in the union; null: not elected.
       * @example 2027-02-28
       */
      oneStopShopFrom?: string | null;
      phone?: string | null;
      postcode: string;
      registrationNumber?: string | null;
      vatNumber?: string | null;
      warrantyMonths: number;
      /** @description ISO weekdays on which the shop works: Monday 1 to Sunday 7. */
      workingWeekdays: number[];
    };
    ShopListingDto: {
      drawing: string | null;
      family: string;
      /** @enum {string} */
      form: 'kit' | 'spare' | 'tool';
      id: number;
      /** @description Null when its destination's VAT is a matter to ask us about. */
      price: components['schemas']['ShopPriceDto'] | null;
      promise: components['schemas']['ShopPromiseDto'];
      slug: string;
      summary: string;
      title: string;
    };
    ShopListingsDto: {
      /** @description Why there are no prices, as a sentence; null when there are. */
      ask: string | null;
      items: components['schemas']['ShopListingDto'][];
    };
    ShopPositionDto: {
      /** @description The number in the drawing. */
      mark: string;
      name: string;
    };
    ShopPriceDto: {
      gross: components['schemas']['MoneyDto'];
      net: components['schemas']['MoneyDto'];
      /** @description Name of the country whose VAT it is; null for an export. */
      vatCountry: string | null;
      /** @description Percent. */
      vatRate: string;
    };
    ShopProductDto: {
      ask: string | null;
      cautions: string[];
      /** @description What is in the kit's bags; empty for tools and spares. */
      contents: components['schemas']['ShopContentDto'][];
      description: string;
      drawing: string | null;
      family: string;
      /** @enum {string} */
      form: 'kit' | 'spare' | 'tool';
      id: number;
      /** @description Names of the numbered positions in the drawing. */
      positions: components['schemas']['ShopPositionDto'][];
      /** @description Null when its destination's VAT is a matter to ask us about. */
      price: components['schemas']['ShopPriceDto'] | null;
      promise: components['schemas']['ShopPromiseDto'];
      /** @description The same thing in its other forms. */
      siblings: components['schemas']['ShopListingDto'][];
      skills: string | null;
      slug: string;
      summary: string;
      title: string;
    };
    ShopPromiseDto: {
      /** @description Comes out of a batch under way, not from the shelf. */
      fromBatch: boolean;
      /** @description `YYYY-MM-DD` */
      leavesBy: string | null;
    };
    ShortPartDto: {
      claimed: string;
      free: string;
      measure: string;
      name: string;
      part: string;
      reorderPoint: string | null;
      /** @description By how much more is claimed than can be used; null when only the reorder point is passed. */
      short: string | null;
      /** @description The one to order from first. */
      supplier: string | null;
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
      role?: 'accountant' | 'assembler' | 'owner';
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
    StaffRole: 'accountant' | 'assembler' | 'owner';
    StepChangeDto: {
      after: components['schemas']['BuildStepDto'] | null;
      before: components['schemas']['BuildStepDto'] | null;
      fields: string[];
      /** @enum {string} */
      kind: 'added' | 'changed' | 'removed';
    };
    StepTickDto: {
      /** @description Done, or not done after all. */
      done: boolean;
      /** @description On which units. */
      units: string[];
    };
    StockDocumentDto: {
      number: string;
    };
    StockValueDto: {
      /** @description What the stock accounts carry; the same, at every moment. */
      accountsBalance: components['schemas']['MoneyDto'];
      items: components['schemas']['StockValueItemDto'][];
      /** @description Of the whole shelf, whatever is searched for. */
      shelfValue: components['schemas']['MoneyDto'];
      total: number;
    };
    StockValueItemDto: {
      /** @description The stock account it stands in. */
      account: string;
      averageCost: string;
      measure: string;
      name: string;
      part: string;
      quantity: string;
      value: components['schemas']['MoneyDto'];
    };
    StripUnitDto: {
      finished: boolean;
      serial: string;
      stepsDone: number;
      stepsTotal: number;
      /** @enum {string} */
      verdict: 'failed' | 'open' | 'passed' | 'rework' | 'scrapped';
    };
    SubAssemblyInputDto: {
      /** @description From the shelf, or built within the batch. */
      fromShelf: boolean;
      path: string;
      version: number;
    };
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
    TakenPartDto: {
      free: string;
      part: components['schemas']['BillPartDto'];
      /** @description What building all of them takes from the shelf. */
      taken: string;
    };
    TestRunDto: {
      measuredAt: string | null;
      readings: components['schemas']['RunReadingDto'][];
      run: number;
      startedAt: string;
      /**
       * @description Worked out when each characteristic has a reading.
       * @enum {string|null}
       */
      verdict: 'fail' | 'pass' | null;
      voidedAt: string | null;
      voidReason: string | null;
    };
    TodayActionDto: {
      label: string;
      /** @description The address of the screen where it is done. */
      to: string;
    };
    TodayBatchDto: {
      code: string;
      current: string | null;
      note: string;
      units: components['schemas']['TodayUnitDto'][];
    };
    TodayDto: {
      batches: components['schemas']['TodayBatchDto'][];
      day: string;
      figures: components['schemas']['TodayFigureDto'][];
      promises: components['schemas']['TodayPromisesDto'] | null;
      queue: components['schemas']['TodayItemDto'][];
    };
    TodayFigureDto: {
      count: string | null;
      label: string;
      money: components['schemas']['MoneyDto'] | null;
    };
    TodayItemDto: {
      action: components['schemas']['TodayActionDto'] | null;
      because: string | null;
      due: string | null;
      key: string;
      late: boolean;
      /** @description Names things in braces. */
      sentence: string;
      /** @description Warns without anything being wrong yet. */
      signal: boolean;
    };
    TodayPromisesDto: {
      safe: number;
      thisWeek: number;
    };
    TodayUnitDto: {
      serial: string;
      stepsDone: number;
      stepsTotal: number;
      /** @enum {string} */
      verdict: 'failed' | 'open' | 'passed' | 'rework' | 'scrapped';
    };
    TransferInputDto: {
      lines: components['schemas']['TransferLineDto'][];
      note?: string | null;
    };
    TransferLineDto: {
      /** @description Where it lies. */
      bin: string;
      /** @description Not needed for a part followed by count. */
      lot?: string | null;
      part: string;
      /**
       * Format: decimal
       * @example 12.5
       */
      quantity: string;
      /** @description Where it goes. */
      toBin: string;
    };
    TreeRowDto: {
      alternates: string[];
      level: number;
      madeBy: number | null;
      marks: string | null;
      parent: string;
      part: components['schemas']['BillPartDto'];
      /** @description Positions from the made part down to this line. */
      path: number[];
      /** @description What this place takes with its allowance for scrap, to four decimals. */
      quantity: string;
      quantityPer: string;
      scrapPercent: string;
    };
    TreeTotalDto: {
      /** @description Longest way down to it. */
      level: number;
      made: boolean;
      part: components['schemas']['BillPartDto'];
      /** @description Rounded up once per bill to what can be handed out. */
      quantity: string;
    };
    TrialBalanceDto: {
      accounts: components['schemas']['AccountBalanceDto'][];
      credit: components['schemas']['MoneyDto'];
      debit: components['schemas']['MoneyDto'];
      from: string | null;
      to: string;
    };
    UnitDto: {
      asBuilt: components['schemas']['AsBuiltDto'][];
      batch: string;
      /** @description How many were built together. */
      batchSize: number;
      /** @description The bin it lies in, while it is on the shelf. */
      bin: string | null;
      completedAt: string | null;
      faults: components['schemas']['FaultDto'][];
      id: number;
      issuedAt: string;
      /** @description The path of its public page. */
      page: string;
      part: string;
      partName: string;
      place: number;
      revision: number;
      rework: components['schemas']['UnitReworkDto'][];
      runs: components['schemas']['TestRunDto'][];
      scrappedAt: string | null;
      scrapReason: string | null;
      serial: string;
      sound: boolean;
      /** @enum {string} */
      state: 'gone' | 'on_shelf' | 'scrapped' | 'under_way';
      steps: components['schemas']['UnitStepDto'][];
    };
    UnitItemDto: {
      batch: string;
      /** @description The bin it lies in, while it is on the shelf. */
      bin: string | null;
      completedAt: string | null;
      id: number;
      issuedAt: string;
      part: string;
      partName: string;
      revision: number;
      serial: string;
      sound: boolean;
      /** @enum {string} */
      state: 'gone' | 'on_shelf' | 'scrapped' | 'under_way';
    };
    UnitPageDto: {
      items: components['schemas']['UnitItemDto'][];
      total: number;
    };
    UnitReworkDto: {
      doneAt: string;
      doneBy: string | null;
      minutes: string;
      what: string;
    };
    UnitRunsDto: {
      /** @description The run that the next reading is for. */
      nextRun: number;
      runs: components['schemas']['TestRunDto'][];
      serial: string;
    };
    UnitStepDto: {
      caution: string | null;
      doneAt: string | null;
      doneBy: string | null;
      position: number;
      title: string;
    };
    UseDto: {
      /** @description Whether it is only an alternate of the line. */
      alternate: boolean;
      /** @description 1 where the part itself is in the bill, 2 where what it is in is in the bill, and so on. */
      level: number;
      part: components['schemas']['BillPartDto'];
      /** @description Codes from the part up to this bill's part. */
      path: string[];
      position: number;
      quantityPer: string;
      revision: number;
      /** @enum {string} */
      status: 'draft' | 'released' | 'superseded';
      /** @description Whether nothing that is in force or in draft contains this bill's part. */
      top: boolean;
    };
    /** @enum {string} */
    UserStatus: 'active' | 'disabled' | 'invited' | 'unconfirmed';
    VatExceptionDto: {
      countryCode: string;
      /** @description The beginning of the postcodes it holds for. */
      postcodePrefix: string;
      /** @description What the buyer is told. */
      sentence: string;
    };
    VatExceptionInputDto: {
      countryCode: string;
      /** @description The beginning of the postcodes it holds for. */
      postcodePrefix: string;
      /** @description What the buyer is told. */
      sentence: string;
    };
    VatExceptionsDto: {
      items: components['schemas']['VatExceptionDto'][];
      total: number;
    };
    VatRateDto: {
      countryCode: string;
      id: number;
      /** @description Percent. */
      rate: string;
      /** @description Where the rate was read. */
      source: string;
      /**
       * Format: date
       * @example 2027-02-28
       */
      validFrom: string;
      validUntil: string | null;
    };
    VatRateInputDto: {
      countryCode: string;
      /** @description Percent. */
      rate: string;
      /** @description Where the rate was read. */
      source: string;
      /**
       * Format: date
       * @example 2027-02-28
       */
      validFrom: string;
    };
    VatRatesDto: {
      items: components['schemas']['VatRateDto'][];
      total: number;
    };
    WhereUsedDto: {
      kits: components['schemas']['KitUseDto'][];
      part: components['schemas']['BillPartDto'];
      uses: components['schemas']['UseDto'][];
    };
    WithdrawalInputDto: {
      /** @description Why it will not be built. */
      reason: string;
    };
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
        actorRole?: 'accountant' | 'assembler' | 'customer' | 'owner';
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
  Batches_list: {
    parameters: {
      query?: {
        /** @description Neither done nor withdrawn. */
        open?: boolean;
        page?: number;
        pageSize?: number;
        part?: string;
        /** @description Words to look for. */
        q?: string;
        /** @description A column to sort by; a hyphen in front turns the order round. */
        sort?: string;
        status?: 'done' | 'in_build' | 'picking' | 'planned' | 'withdrawn';
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
          'application/json': components['schemas']['BatchPageDto'];
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
  Batches_plan: {
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
        'application/json': components['schemas']['BatchInputDto'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['BatchDto'];
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
  Batches_open: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        number: string;
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
          'application/json': components['schemas']['BatchDto'];
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
  Batches_start: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        number: string;
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
          'application/json': components['schemas']['BatchDto'];
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
  Batches_claim: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        number: string;
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
          'application/json': components['schemas']['BatchDto'];
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
  Batches_issue: {
    parameters: {
      query?: never;
      header: {
        /** @description Made afresh for each thing to create, and kept when the same request is sent again. */
        'Idempotency-Key': string;
      };
      path: {
        number: string;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['IssueInputDto'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['BatchDocumentDto'];
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
  Units_labels: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        number: string;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
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
  Batches_completePieces: {
    parameters: {
      query?: never;
      header: {
        /** @description Made afresh for each thing to create, and kept when the same request is sent again. */
        'Idempotency-Key': string;
      };
      path: {
        number: string;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['MadePiecesDto'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['BatchDocumentDto'];
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
  Batches_pickList: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        number: string;
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
          'application/json': components['schemas']['PickListDto'];
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
  Batches_giveBack: {
    parameters: {
      query?: never;
      header: {
        /** @description Made afresh for each thing to create, and kept when the same request is sent again. */
        'Idempotency-Key': string;
      };
      path: {
        number: string;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['IssueInputDto'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['BatchDocumentDto'];
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
  Batches_tick: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        number: string;
        position: number;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['StepTickDto'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['BatchDto'];
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
  Batches_choose: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        number: string;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['SubAssemblyInputDto'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['BatchDto'];
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
  Batches_withdraw: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        number: string;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['WithdrawalInputDto'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['BatchDto'];
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
  Bills_components: {
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
          'application/json': components['schemas']['ComponentListDto'];
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
  Bills_list: {
    parameters: {
      query?: {
        page?: number;
        pageSize?: number;
        /** @description Words to look for. */
        q?: string;
        /** @description A column to sort by; a hyphen in front turns the order round. */
        sort?: string;
        /** @description `draft`: those with a draft; `released`: those with a revision in force; `unreleased`: those with a draft only. */
        state?: 'draft' | 'released' | 'unreleased';
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
          'application/json': components['schemas']['BillListDto'];
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
  Bills_open: {
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
          'application/json': components['schemas']['BillDto'];
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
  Bills_compare: {
    parameters: {
      query: {
        from: number;
        to: number;
      };
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
          'application/json': components['schemas']['BillComparisonDto'];
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
  Bills_create: {
    parameters: {
      query?: never;
      header: {
        /** @description Made afresh for each thing to create, and kept when the same request is sent again. */
        'Idempotency-Key': string;
      };
      path: {
        code: string;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['NewDraftDto'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['BillRevisionDto'];
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
  Bills_revision: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        code: string;
        number: number;
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
          'application/json': components['schemas']['BillRevisionDto'];
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
  Bills_edit: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        code: string;
        number: number;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['BillEditDto'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['BillRevisionDto'];
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
  DesignFigures_buildable: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        code: string;
        number: number;
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
          'application/json': components['schemas']['BuildableDto'];
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
  DesignFigures_cost: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        code: string;
        number: number;
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
          'application/json': components['schemas']['BillCostDto'];
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
  Bills_discard: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        code: string;
        number: number;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['RevisionVersionDto'];
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
  Bills_release: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        code: string;
        number: number;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['RevisionVersionDto'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['BillRevisionDto'];
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
  Bills_tree: {
    parameters: {
      query?: {
        /** @description How many are made; one when nothing is said. */
        quantity?: string;
      };
      header?: never;
      path: {
        code: string;
        number: number;
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
          'application/json': components['schemas']['BillTreeDto'];
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
  Bills_whereUsed: {
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
          'application/json': components['schemas']['WhereUsedDto'];
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
  Bins_list: {
    parameters: {
      query?: {
        page?: number;
        pageSize?: number;
        /** @description Words to look for. */
        q?: string;
        quarantine?: boolean;
        /** @description Also the ones no longer in use. */
        retired?: boolean;
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
          'application/json': components['schemas']['BinPageDto'];
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
  Bins_create: {
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
        'application/json': components['schemas']['BinInputDto'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['BinDto'];
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
  Bins_get: {
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
          'application/json': components['schemas']['BinDto'];
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
  Bins_edit: {
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
        'application/json': components['schemas']['BinEditDto'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['BinDto'];
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
  Bins_bringBack: {
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
        'application/json': components['schemas']['BinRetireDto'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['BinDto'];
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
  Bins_retire: {
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
        'application/json': components['schemas']['BinRetireDto'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['BinDto'];
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
  Exports_entries: {
    parameters: {
      query: {
        from: string;
        to: string;
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
  Exports_invoices: {
    parameters: {
      query: {
        from: string;
        to: string;
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
  Exports_totals: {
    parameters: {
      query: {
        from: string;
        to: string;
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
          'application/json': components['schemas']['ExportTotalsDto'];
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
  Shop_countries: {
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
          'application/json': components['schemas']['CountriesDto'];
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
  Deliveries_list: {
    parameters: {
      query?: {
        page?: number;
        pageSize?: number;
        /** @description Words to look for. */
        q?: string;
        /** @description A column to sort by; a hyphen in front turns the order round. */
        sort?: string;
        /** @description A supplier's code. */
        supplier?: string;
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
          'application/json': components['schemas']['DeliveryPageDto'];
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
  Deliveries_receive: {
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
        'application/json': components['schemas']['DeliveryInputDto'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['DeliveryDto'];
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
  Deliveries_get: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        number: string;
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
          'application/json': components['schemas']['DeliveryDto'];
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
  TaxSettings_deliveryRates: {
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
          'application/json': components['schemas']['DeliveryRatesDto'];
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
  TaxSettings_addDeliveryRate: {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['DeliveryRateInputDto'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['DeliveryRateDto'];
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
  TaxSettings_removeDeliveryRate: {
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
  DesignFigures_designQueue: {
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
          'application/json': components['schemas']['DesignQueueDto'];
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
  OrderDesk_list: {
    parameters: {
      query?: {
        page?: number;
        pageSize?: number;
        /** @description Words to look for. */
        q?: string;
        /** @description A column to sort by; a hyphen in front turns the order round. */
        sort?: string;
        state?:
          | 'building'
          | 'cancelled'
          | 'packed'
          | 'packing'
          | 'paying'
          | 'ready'
          | 'review'
          | 'shipped'
          | 'short'
          | 'unpaid';
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
          'application/json': components['schemas']['OrderDeskPageDto'];
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
  OrderDesk_get: {
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
          'application/json': components['schemas']['OrderDeskDto'];
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
  Testing_listFaults: {
    parameters: {
      query?: {
        /** @description Not closed yet. */
        open?: boolean;
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
          'application/json': components['schemas']['FaultPageDto'];
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
  Testing_openFault: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        number: string;
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
          'application/json': components['schemas']['FaultDto'];
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
  Testing_noFault: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        number: string;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['NoFaultInputDto'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['FaultDto'];
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
  Testing_rework: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        number: string;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['ReworkInputDto'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['FaultDto'];
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
  Find_list: {
    parameters: {
      query: {
        limit?: number;
        /** @description A scanned code, or a few letters. */
        q: string;
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
          'application/json': components['schemas']['FoundListDto'];
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
  Testing_firstPasses: {
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
          'application/json': components['schemas']['FirstPassListDto'];
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
  Imports_list: {
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
          'application/json': components['schemas']['ImportRunPageDto'];
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
  Imports_apply: {
    parameters: {
      query?: never;
      header: {
        /** @description Made afresh for each thing to create, and kept when the same request is sent again. */
        'Idempotency-Key': string;
      };
      path: {
        kind: string;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'multipart/form-data': {
          /** @enum {string} */
          decimalSign?: 'comma' | 'point';
          /** Format: binary */
          file: string;
          mapping?: string;
        };
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['AppliedImportDto'];
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
  Imports_dryRun: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        kind: string;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'multipart/form-data': {
          /** @enum {string} */
          decimalSign?: 'comma' | 'point';
          /** Format: binary */
          file: string;
          mapping?: string;
        };
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ImportCheckDto'];
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
  Imports_template: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        kind: string;
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
          'application/json': string;
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
  Imports_listKinds: {
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
          'application/json': components['schemas']['ImportKindsDto'];
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
  Invoices_list: {
    parameters: {
      query?: {
        /** @description First day of issue. */
        from?: string;
        kind?: 'credit_note' | 'invoice';
        page?: number;
        pageSize?: number;
        /** @description Words to look for. */
        q?: string;
        /** @description A column to sort by; a hyphen in front turns the order round. */
        sort?: string;
        /** @description Last day of issue. */
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
          'application/json': components['schemas']['InvoicePageDto'];
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
  Invoices_get: {
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
          'application/json': components['schemas']['InvoiceDto'];
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
  Invoices_pdf: {
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
  Books_journal: {
    parameters: {
      query?: {
        /** @description Entries with a line on this account. */
        account?: string;
        /** @description Entries of one document, by its number. */
        document?: string;
        from?: string;
        page?: number;
        pageSize?: number;
        /** @description Words to look for. */
        q?: string;
        /** @description A column to sort by; a hyphen in front turns the order round. */
        sort?: string;
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
          'application/json': components['schemas']['JournalPageDto'];
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
  Contents_list: {
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
          'application/json': components['schemas']['KitListDto'];
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
  Contents_open: {
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
          'application/json': components['schemas']['ContentsDto'];
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
  Contents_edit: {
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
        'application/json': components['schemas']['ContentsEditDto'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ContentsDto'];
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
  Lots_list: {
    parameters: {
      query?: {
        /** @description A bin's code: lots of which something lies there. */
        bin?: string;
        /** @description Out of date, or within thirty days. */
        expiring?: boolean;
        page?: number;
        pageSize?: number;
        /** @description A part's code. */
        part?: string;
        /** @description Words to look for. */
        q?: string;
        /** @description A column to sort by; a hyphen in front turns the order round. */
        sort?: string;
        status?: 'held' | 'rejected' | 'released';
        /** @description A supplier's code. */
        supplier?: string;
        /** @description Also the ones of which nothing is left. */
        used?: boolean;
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
          'application/json': components['schemas']['LotPageDto'];
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
  Lots_get: {
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
          'application/json': components['schemas']['LotDto'];
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
  Lots_changeStatus: {
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
        'application/json': components['schemas']['LotStatusInputDto'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['LotDto'];
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
  Cancellations_cancel: {
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
        'application/json': components['schemas']['CancelOrderInput'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['CancellationDto'];
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
        state?: 'given_up' | 'sent' | 'uncertain' | 'waiting';
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
  BuyerOrders_list: {
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
          'application/json': components['schemas']['BuyerOrdersDto'];
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
  Parcels_list: {
    parameters: {
      query?: {
        page?: number;
        pageSize?: number;
        /** @description Words to look for. */
        q?: string;
        /** @description A column to sort by; a hyphen in front turns the order round. */
        sort?: string;
        state?: 'dissolved' | 'packed' | 'packing' | 'shipped';
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
          'application/json': components['schemas']['ParcelPageDto'];
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
  Parcels_open: {
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
        'application/json': components['schemas']['OpenParcelInput'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ParcelDto'];
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
  Parcels_get: {
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
          'application/json': components['schemas']['ParcelDto'];
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
  Parcels_carrierAnswer: {
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
        'application/json': components['schemas']['CarrierAnswerInput'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ParcelDto'];
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
  Parcels_dispatch: {
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
        'application/json': components['schemas']['DispatchInput'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ParcelDto'];
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
  Parcels_takeOut: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        code: string;
        id: number;
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
          'application/json': components['schemas']['ParcelDto'];
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
  Parcels_sayLithium: {
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
        'application/json': components['schemas']['LithiumInput'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ParcelDto'];
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
  Parcels_close: {
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
        'application/json': components['schemas']['ParcelVersionInput'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ParcelDto'];
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
  Parcels_slip: {
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
  Parcels_reopen: {
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
        'application/json': components['schemas']['ParcelVersionInput'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ParcelDto'];
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
  Parcels_scan: {
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
        'application/json': components['schemas']['ScanInput'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ScanAnswerDto'];
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
  Shelf_listParts: {
    parameters: {
      query?: {
        /** @description A bin's code: parts of which something lies there. */
        bin?: string;
        page?: number;
        pageSize?: number;
        /** @description Words to look for. */
        q?: string;
        /** @description Only the ones no longer in use; otherwise only those that are. */
        retired?: boolean;
        /** @description Less is free than the reorder point, or more is claimed than can be used. */
        short?: boolean;
        /** @description A column to sort by; a hyphen in front turns the order round. */
        sort?: string;
        /** @description A supplier's code: parts that can be bought there. */
        supplier?: string;
        traced?: 'count' | 'delivery' | 'single';
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
          'application/json': components['schemas']['PartPageDto'];
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
  Shelf_getPart: {
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
          'application/json': components['schemas']['PartStoryDto'];
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
  Payments_receive: {
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
  PaymentReviews_settle: {
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
        'application/json': components['schemas']['SettleReviewInput'];
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
  Books_payments: {
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
          'application/json': components['schemas']['ReceivedPaymentsDto'];
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
  Exports_months: {
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
          'application/json': components['schemas']['MonthsDto'];
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
  Exports_close: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        month: string;
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
  Exports_reopen: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        month: string;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['ReopenMonthInput'];
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
  Books_postingRules: {
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
          'application/json': components['schemas']['PostingRulesDto'];
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
  Shelf_readQueue: {
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
          'application/json': components['schemas']['ShelfQueueDto'];
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
  Storefront_front: {
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
          'application/json': components['schemas']['ShopFrontDto'];
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
  Shop_read: {
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
          'application/json': components['schemas']['ShopAnswerDto'];
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
  Shop_edit: {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['ShopEditDto'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ShopDto'];
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
  Shop_setUp: {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['ShopInputDto'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ShopDto'];
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
  Shop_closedDays: {
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
          'application/json': components['schemas']['ClosedDaysDto'];
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
  Shop_close: {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['ClosedDayInputDto'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ClosedDayDto'];
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
  Shop_open: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        day: string;
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
  Storefront_list: {
    parameters: {
      query?: {
        /** @description Where it goes, by ISO 3166-1; the shop's own country when nothing is said. */
        country?: string;
        postcode?: string;
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
          'application/json': components['schemas']['ShopListingsDto'];
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
  Storefront_product: {
    parameters: {
      query?: {
        /** @description Where it goes, by ISO 3166-1; the shop's own country when nothing is said. */
        country?: string;
        postcode?: string;
      };
      header?: never;
      path: {
        slug: string;
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
          'application/json': components['schemas']['ShopProductDto'];
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
  Checkout_order: {
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
        'application/json': components['schemas']['CheckoutDto'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['CheckedOutDto'];
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
  BuyerOrders_open: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        number: string;
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
          'application/json': components['schemas']['BuyerOrderDto'];
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
  Checkout_payAgain: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        number: string;
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
          'application/json': components['schemas']['PaymentPageDto'];
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
  Storefront_quote: {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['BasketDto'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['QuoteDto'];
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
  StockMoves_adjust: {
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
        'application/json': components['schemas']['AdjustmentInputDto'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['StockDocumentDto'];
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
  StockMoves_reverse: {
    parameters: {
      query?: never;
      header: {
        /** @description Made afresh for each thing to create, and kept when the same request is sent again. */
        'Idempotency-Key': string;
      };
      path: {
        number: string;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['ReversalInputDto'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['StockDocumentDto'];
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
  StockMoves_list: {
    parameters: {
      query?: {
        bin?: string;
        /** @description First day, in the shop's zone. */
        from?: string;
        lot?: string;
        page?: number;
        pageSize?: number;
        part?: string;
        /** @description Words to look for. */
        q?: string;
        reason?: string;
        /** @description A column to sort by; a hyphen in front turns the order round. */
        sort?: string;
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
          'application/json': components['schemas']['MovePageDto'];
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
  StockMoves_transfer: {
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
        'application/json': components['schemas']['TransferInputDto'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['StockDocumentDto'];
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
  Shelf_readValue: {
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
          'application/json': components['schemas']['StockValueDto'];
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
  Today_get: {
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
          'application/json': components['schemas']['TodayDto'];
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
  Books_trialBalance: {
    parameters: {
      query?: {
        /** @description First day; the beginning when nothing is said. */
        from?: string;
        /** @description Last day; today when nothing is said. */
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
          'application/json': components['schemas']['TrialBalanceDto'];
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
  Units_publicPage: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        token: string;
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
          'application/json': components['schemas']['PublicUnitDto'];
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
  Units_list: {
    parameters: {
      query?: {
        batch?: string;
        page?: number;
        pageSize?: number;
        part?: string;
        /** @description Words to look for. */
        q?: string;
        /** @description A column to sort by; a hyphen in front turns the order round. */
        sort?: string;
        state?: 'gone' | 'on_shelf' | 'scrapped' | 'under_way';
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
          'application/json': components['schemas']['UnitPageDto'];
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
  Units_open: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        serial: string;
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
          'application/json': components['schemas']['UnitDto'];
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
  Batches_complete: {
    parameters: {
      query?: never;
      header: {
        /** @description Made afresh for each thing to create, and kept when the same request is sent again. */
        'Idempotency-Key': string;
      };
      path: {
        serial: string;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['CompletionDto'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['FinishedUnitDto'];
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
  Testing_report: {
    parameters: {
      query?: never;
      header: {
        /** @description Made afresh for each thing to create, and kept when the same request is sent again. */
        'Idempotency-Key': string;
      };
      path: {
        serial: string;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['FaultInputDto'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['FaultDto'];
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
  Batches_fitLot: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        serial: string;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['FittedLotDto'];
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
  Units_label: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        serial: string;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
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
  Testing_record: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        serial: string;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['ReadingInputDto'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ReadingResultDto'];
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
  Batches_scrap: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        serial: string;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['ScrapDto'];
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
  Testing_list: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        serial: string;
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
          'application/json': components['schemas']['UnitRunsDto'];
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
  TaxSettings_vatExceptions: {
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
          'application/json': components['schemas']['VatExceptionsDto'];
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
  TaxSettings_addVatException: {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['VatExceptionInputDto'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['VatExceptionDto'];
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
  TaxSettings_removeVatException: {
    parameters: {
      query?: never;
      header?: never;
      path: {
        country: string;
        prefix: string;
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
  TaxSettings_vatRates: {
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
          'application/json': components['schemas']['VatRatesDto'];
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
  TaxSettings_addVatRate: {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['VatRateInputDto'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['VatRateDto'];
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
  TaxSettings_removeVatRate: {
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
}
