/** Opens inputs and saves campaign folders; offered as the services {@code Intake} and {@code CampaignFolder}. */
package org.saddlebook.intake.internal;
