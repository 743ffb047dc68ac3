/** Campaign and findings as JSON; offered as the service {@code CampaignFormat}. */
package org.saddlebook.campaign.json.internal;
