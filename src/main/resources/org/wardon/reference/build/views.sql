-- The rows that speak of a commodity: its own, then those of what it becomes (table states).
create view commodity_rows as
select c.commodity_id as commodity_id,
       c.commodity_id as rows_of,
       coalesce((select max(s.state) from states s
                  where s.rows_of = c.commodity_id and s.state in ('ripe', 'turning')),
                (select 'green' from states s
                  where s.commodity_id = c.commodity_id and s.state = 'ripe' limit 1),
                'not-stated') as state,
       0 as later
  from commodities c
union all
select s.commodity_id, s.rows_of, s.state, 1 from states s;

-- Heat of respiration from all three tables, W/t. Rates printed as carbon dioxide are turned with
-- 10.7 J per mg CO2: 1 mg/(kg h) = 10.7 / 3.6 W/t = 2.9722 W/t.
-- Source: head of the table of power laws, after Becker, Misra and Fricke 1996.
create view respiration_rows as
select commodity_id, temp_C, W_per_tonne_low as heat_low, W_per_tonne_high as heat_high,
       source_id, evidence, evidence_text, 'heat' as heat_table, line
  from respiration_heat
union all
select commodity_id, temp_C, mgCO2_kg_h_low * 10.7 / 3.6, mgCO2_kg_h_high * 10.7 / 3.6,
       source_id, evidence, evidence_text, 'co2', line
  from respiration
union all
select commodity_id, temp_C, mgCO2_kg_h_low * 10.7 / 3.6, mgCO2_kg_h_high * 10.7 / 3.6,
       source_id, evidence, evidence_text, 'co2-other', line
  from respiration_alt;

-- Q10 of a commodity, of its respiration, of one of its qualities, and of the class all belong to.
create view q10_rows as
select c.commodity_id, q10.*
  from commodities c
  join q10 on q10.commodity_or_class = c.commodity_id
           or q10.commodity_or_class = 'respiration:' || c.commodity_id
           or q10.commodity_or_class like c.commodity_id || '-%'
           or q10.commodity_or_class like 'respiration:' || c.commodity_id || '-%'
           or q10.commodity_or_class like 'class:%';

-- What a commodity needs and what heat it gives: the forecast reads this view. One row for every
-- printed rate of respiration; a commodity without one has a single row without heat.
create view commodity_needs as
select c.commodity_id as commodity_id,
       c.temp_low_C as temperature_low_C, c.temp_high_C as temperature_high_C,
       c.rh_low_pct as humidity_low_pct, c.rh_high_pct as humidity_high_pct,
       c.source_id as needs_source_id, c.evidence as needs_evidence,
       h.temp_C as heat_at_C,
       h.heat_low as heat_low_W_per_tonne, h.heat_high as heat_high_W_per_tonne,
       k.state as state, h.source_id as heat_source_id, h.heat_table as heat_table,
       h.evidence as heat_evidence, k.later as later, h.line as heat_line
  from commodities c
  join commodity_rows k on k.commodity_id = c.commodity_id
  left join respiration_rows h on h.commodity_id = k.rows_of
  where h.commodity_id is not null or k.later = 0;


-- Every printed fact of every commodity under a stable name, for a person to read; where a fact is a
-- word, low and high are empty and text holds it.
create view commodity_facts as
select commodity_id as commodity_id, 10 as ord, 'storage-temperature' as name, temp_low_C as low, temp_high_C as high,
       'C' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce(note, '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'commodities' as table_name, line
  from commodities where temp_low_C is not null
union all
select commodity_id as commodity_id, 11 as ord, 'storage-humidity' as name, rh_low_pct as low, rh_high_pct as high,
       'pct' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce('', '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'commodities' as table_name, line
  from commodities where rh_low_pct is not null
union all
select commodity_id as commodity_id, 12 as ord, 'storage-life' as name, life_low_days as low, life_high_days as high,
       'day' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce('', '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'commodities' as table_name, line
  from commodities where life_low_days is not null
union all
select commodity_id as commodity_id, 13 as ord, 'highest-freezing-point' as name, highest_freezing_C as low, highest_freezing_C as high,
       'C' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce('', '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'commodities' as table_name, line
  from commodities where highest_freezing_C is not null
union all
select commodity_id as commodity_id, 14 as ord, 'climacteric' as name, null as low, null as high,
       '' as unit, climacteric as text, source_id as source_id, evidence as evidence,
       trim(coalesce('', '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'commodities' as table_name, line
  from commodities
union all
select commodity_id as commodity_id, 15 as ord, 'ethylene-production-class' as name, null as low, null as high,
       '' as unit, ethylene_production_class as text, source_id as source_id, evidence as evidence,
       trim(coalesce('', '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'commodities' as table_name, line
  from commodities where ethylene_production_class is not null
union all
select commodity_id as commodity_id, 16 as ord, 'ethylene-sensitivity-class' as name, null as low, null as high,
       '' as unit, ethylene_sensitivity_class as text, source_id as source_id, evidence as evidence,
       trim(coalesce('', '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'commodities' as table_name, line
  from commodities where ethylene_sensitivity_class is not null
union all
select commodity_id as commodity_id, 20 as ord, 'chilling-floor' as name, lowest_safe_C as low, coalesce(lowest_safe_high_C, lowest_safe_C) as high,
       'C' as unit, case when lowest_safe_C is null then 'hardly sensitive' else '' end as text, source_id as source_id, evidence as evidence,
       trim(coalesce(trim(coalesce('; ' || symptoms, '') || coalesce('; ' || nullif(ripeness, 'not-stated'), '') || coalesce('; ' || variant, '') || coalesce('; ' || case when zone = 'band' then 'top of a damaging band' || case when band_low_C is null then '' else ' from ' || printf('%g', band_low_C) || ' C' end end, ''), '; '), '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'chilling' as table_name, line
  from chilling
union all
select commodity_id as commodity_id, 21 as ord, printf('chilling@%gC', temp_C) as name, days_to_injury as low, coalesce(days_high, days_to_injury) as high,
       'day' as unit, kind as text, source_id as source_id, evidence as evidence,
       trim(coalesce(note, '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'chilling-exposure' as table_name, line
  from chilling_exposure
union all
select commodity_id as commodity_id, 30 as ord, printf('life@%gC', temp_C) as name, life_days_low as low, life_days_high as high,
       'day' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce(trim(coalesce('; ' || criterion, '') || coalesce('; ' || variant, '') || coalesce('; ' || rh_pct || ' % humidity', '') || coalesce('; ' || 'ended by ' || ended_by, '') || coalesce('; ' || bound, '') || coalesce('; ' || nullif(ripeness, 'not-stated'), '') || coalesce('; ' || nullif(package, 'not-stated'), '') || coalesce('; ' || note, ''), '; '), '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'life-temperature' as table_name, line
  from life_temperature
union all
select commodity_id as commodity_id, 31 as ord, printf('q10@%g-%gC', temp_low_C, temp_high_C) as name, q10 + 0.0 as low, case when instr(q10, '-') > 0 then substr(q10, instr(q10, '-') + 1) + 0.0 else q10 + 0.0 end as high,
       '1' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce(trim(coalesce('; ' || commodity_or_class, '') || coalesce('; ' || note, ''), '; '), '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'q10' as table_name, line
  from q10_rows
union all
select commodity_id as commodity_id, 32 as ord, 'fitted-activation-energy' as name, Ea_kJ_mol as low, Ea_kJ_mol as high,
       'kJ/mol' as unit, '' as text, source_id as source_id, 'derived' as evidence,
       trim(coalesce(trim(coalesce('; ' || variant, '') || coalesce('; ' || printf('%g to %g C, %g temperatures, life at 10 C %g days', temp_min_C, temp_max_C, n_temps, life_at_10C_days), '') || coalesce('; ' || note, ''), '; '), '') || '; ' || '', '; ') as note,
       'fitted-rates' as table_name, line
  from fitted_rates
union all
select commodity_id as commodity_id, 33 as ord, 'activation-energy' as name, Ea_senescence_kJ_mol as low, Ea_senescence_kJ_mol as high,
       'kJ/mol' as unit, case when Ea_senescence_kJ_mol is null then coalesce(attribute, '') else '' end as text, source_id as source_id, evidence as evidence,
       trim(coalesce(trim(coalesce('; ' || attribute, '') || coalesce('; ' || variant, '') || coalesce('; ' || case when "order" is not null then 'order ' || printf('%g', "order") end, '') || coalesce('; ' || 'k_ref ' || k_ref, '') || coalesce('; ' || note, ''), '; '), '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'keeping-quality-model' as table_name, line
  from keeping_quality_model
union all
select commodity_id as commodity_id, 34 as ord, 'ambient-life' as name, ambient_life_low_d as low, ambient_life_high_d as high,
       'day' as unit, case when ambient_life_low_d is null and ambient_life_high_d is null then cooling else '' end as text, source_id as source_id, evidence as evidence,
       trim(coalesce(trim(coalesce('; ' || ambient_temp_C, '') || coalesce('; ' || variant, '') || coalesce('; ' || 'then ' || cooling, '') || coalesce('; ' || case when cooled_life_d is not null then printf('%g', cooled_life_d) || ' days cooled' end, '') || coalesce('; ' || note, ''), '; '), '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'ambient-practice' as table_name, line
  from ambient_practice where ambient_life_high_d is not null or ambient_life_low_d is not null or cooled_life_d is not null or note is not null
union all
select commodity_id as commodity_id, 35 as ord, 'sprouting' || case when temp_low_C is null and temp_high_C is null then '' when temp_low_C is null then printf('@to-%gC', temp_high_C) when temp_high_C is null then printf('@from-%gC', temp_low_C) when temp_low_C = temp_high_C then printf('@%gC', temp_low_C) else printf('@%g-%gC', temp_low_C, temp_high_C) end as name, days_low as low, days_high as high,
       'day' as unit, case when days_low is null and days_high is null then effect else '' end as text, source_id as source_id, evidence as evidence,
       trim(coalesce(trim(coalesce('; ' || effect, '') || coalesce('; ' || case when rh_limit_pct is not null then printf('%g', rh_limit_pct) || ' % humidity' end, ''), '; '), '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'sprouting' as table_name, line
  from sprouting
union all
select commodity_id as commodity_id, 36 as ord, 'curing-temperature' as name, temp_low_C as low, temp_high_C as high,
       'C' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce(note, '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'curing' as table_name, line
  from curing where source_id is not null and (temp_low_C is not null or temp_high_C is not null)
union all
select commodity_id as commodity_id, 36 as ord, 'curing-humidity' as name, rh_low_pct as low, rh_high_pct as high,
       'pct' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce(note, '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'curing' as table_name, line
  from curing where source_id is not null and (rh_low_pct is not null or rh_high_pct is not null)
union all
select commodity_id as commodity_id, 36 as ord, 'curing-time' as name, days_low as low, days_high as high,
       'day' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce(note, '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'curing' as table_name, line
  from curing where source_id is not null and (days_low is not null or days_high is not null)
union all
select commodity_id as commodity_id, 37 as ord, case leg when 'whole' then 'green-to-ripe' when 'ripening' then 'to-ripe' when 'ripe' then 'ripe-to-overripe' when 'advised' then 'ripening-temperature' when 'cold' then 'ripens-not-in-cold' else 'ripening-fails-in-heat' end || case when leg in ('advised', 'heat', 'cold') then '' else '@' || printf('%g', temp_low_C) || case when temp_high_C > temp_low_C then '-' || printf('%g', temp_high_C) else '' end || 'C' end as name,
       case when leg in ('advised', 'heat', 'cold') then temp_low_C else days_low end as low, case when leg in ('advised', 'heat', 'cold') then temp_high_C else days_high end as high,
       case when leg in ('advised', 'heat', 'cold') then 'C' else 'day' end as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce(trim(coalesce('; ' || case ethylene when 'yes' then 'with ethylene' when 'no' then 'without ethylene' end, '') || coalesce('; ' || note, ''), '; '), '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'ripening' as table_name, line
  from ripening
union all
select commodity_id as commodity_id, 40 as ord, printf('respiration-heat@%gC', temp_C) as name, W_per_tonne_low as low, W_per_tonne_high as high,
       'W/t' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce('', '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'respiration-heat' as table_name, line
  from respiration_heat
union all
select commodity_id as commodity_id, 41 as ord, printf('respiration-heat@%gC', temp_C) as name, round(mgCO2_kg_h_low * 10.7 / 3.6, 1) as low, round(mgCO2_kg_h_high * 10.7 / 3.6, 1) as high,
       'W/t' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce(printf('printed as %g to %g mg CO2/(kg h)', mgCO2_kg_h_low, mgCO2_kg_h_high), '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'respiration' as table_name, line
  from respiration
union all
select commodity_id as commodity_id, 42 as ord, printf('respiration-heat@%gC', temp_C) as name, round(mgCO2_kg_h_low * 10.7 / 3.6, 1) as low, round(mgCO2_kg_h_high * 10.7 / 3.6, 1) as high,
       'W/t' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce(printf('printed as %g to %g mg CO2/(kg h)', mgCO2_kg_h_low, mgCO2_kg_h_high), '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'respiration-alt' as table_name, line
  from respiration_alt
union all
select commodity_id as commodity_id, 43 as ord, 'respiration-law' as name, null as low, null as high,
       '' as unit, printf('mg CO2/(kg h) = %g (1.8 T + 32)^%g', f, g) as text, source_id as source_id, evidence as evidence,
       trim(coalesce('', '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'respiration-heat-coefficients' as table_name, line
  from respiration_heat_coefficients
union all
select commodity_id as commodity_id, 50 as ord, printf('ethylene@%gC', temp_C) as name, uL_C2H4_kg_h_low as low, uL_C2H4_kg_h_high as high,
       'uL/(kg h)' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce(nullif(ripeness, 'not-stated'), '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'ethylene' as table_name, line
  from ethylene
union all
select commodity_id as commodity_id, 51 as ord, 'ethylene-effect' as name, threshold_uL_L as low, threshold_uL_L as high,
       'uL/L' as unit, case when threshold_uL_L is null then effect else '' end as text, source_id as source_id, evidence as evidence,
       trim(coalesce(effect, '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'ethylene-effects' as table_name, line
  from ethylene_effects
union all
select commodity_id as commodity_id, 52 as ord, 'co2-injury-above' as name, co2_injury_pct as low, co2_injury_pct as high,
       'pct' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce(effect, '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'gas-injury' as table_name, line
  from gas_injury where co2_injury_pct is not null
union all
select commodity_id as commodity_id, 53 as ord, 'o2-injury-below' as name, o2_low_pct as low, o2_low_pct as high,
       'pct' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce(effect, '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'gas-injury' as table_name, line
  from gas_injury where o2_low_pct is not null
union all
select giver_id as commodity_id, 54 as ord, 'gives-odour-to' as name, null as low, null as high,
       '' as unit, taker_id as text, source_id as source_id, evidence as evidence,
       trim(coalesce('', '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'odour-transfer' as table_name, line
  from odour_transfer
union all
select taker_id as commodity_id, 55 as ord, 'takes-odour-of' as name, null as low, null as high,
       '' as unit, giver_id as text, source_id as source_id, evidence as evidence,
       trim(coalesce('', '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'odour-transfer' as table_name, line
  from odour_transfer where taker_id <> 'any'
union all
select commodity_id as commodity_id, 60 as ord, 'transpiration-coefficient' as name, k_ng_kg_s_Pa as low, k_ng_kg_s_Pa as high,
       'ng/(kg s Pa)' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce('', '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'transpiration' as table_name, line
  from transpiration where k_ng_kg_s_Pa is not null
union all
select commodity_id as commodity_id, 61 as ord, 'skin-coefficient' as name, coalesce(skin_ks_low_ug_s_m2_Pa, skin_ks_mean_ug_s_m2_Pa) as low, coalesce(skin_ks_high_ug_s_m2_Pa, skin_ks_mean_ug_s_m2_Pa) as high,
       'ug/(s m2 Pa)' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce('mean ' || printf('%g', skin_ks_mean_ug_s_m2_Pa), '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'transpiration' as table_name, line
  from transpiration where skin_ks_mean_ug_s_m2_Pa is not null
union all
select commodity_id as commodity_id, 62 as ord, 'vapour-pressure-lowering' as name, vapour_pressure_lowering_effect as low, vapour_pressure_lowering_effect as high,
       '1' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce('', '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'transpiration' as table_name, line
  from transpiration where vapour_pressure_lowering_effect is not null
union all
select commodity_id as commodity_id, 63 as ord, 'water-loss' || case when temp_C is null then '' else '@' || temp_C || case when temp_C glob '*[0-9]' then 'C' else '' end end as name, weight_loss_pct_per_day as low, weight_loss_pct_per_day as high,
       case unit when 'pct_per_day' then 'pct/day' when 'pct_per_day_per_mbar' then 'pct/(day mbar)' else '' end as unit, case when weight_loss_pct_per_day is null then note else '' end as text, source_id as source_id, evidence as evidence,
       trim(coalesce(trim(coalesce('; ' || variant, '') || coalesce('; ' || case when rh_pct is not null then printf('%g', rh_pct) || ' % humidity' end, '') || coalesce('; ' || 'acceptable ' || max_acceptable_loss_pct || ' %', '') || coalesce('; ' || note, ''), '; '), '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'moisture-loss' as table_name, line
  from moisture_loss
union all
select commodity_id as commodity_id, 64 as ord, 'permissible-loss' as name, max_permissible_loss_pct as low, max_permissible_loss_pct as high,
       'pct' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce(symptom, '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'moisture-loss-limits' as table_name, line
  from moisture_loss_limits
union all
select commodity_id as commodity_id, 70 as ord, 'water' as name, water_pct as low, water_pct as high,
       'pct' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce('', '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'composition' as table_name, line
  from composition where water_pct is not null
union all
select commodity_id as commodity_id, 71 as ord, 'protein' as name, protein_pct as low, protein_pct as high,
       'pct' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce('', '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'composition' as table_name, line
  from composition where protein_pct is not null
union all
select commodity_id as commodity_id, 72 as ord, 'fat' as name, fat_pct as low, fat_pct as high,
       'pct' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce('', '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'composition' as table_name, line
  from composition where fat_pct is not null
union all
select commodity_id as commodity_id, 73 as ord, 'carbohydrate' as name, carbohydrate_pct as low, carbohydrate_pct as high,
       'pct' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce('', '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'composition' as table_name, line
  from composition where carbohydrate_pct is not null
union all
select commodity_id as commodity_id, 74 as ord, 'fibre' as name, fibre_pct as low, fibre_pct as high,
       'pct' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce('', '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'composition' as table_name, line
  from composition where fibre_pct is not null
union all
select commodity_id as commodity_id, 75 as ord, 'ash' as name, ash_pct as low, ash_pct as high,
       'pct' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce('', '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'composition' as table_name, line
  from composition where ash_pct is not null
union all
select commodity_id as commodity_id, 76 as ord, 'initial-freezing-point' as name, initial_freezing_C as low, initial_freezing_C as high,
       'C' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce('', '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'composition' as table_name, line
  from composition where initial_freezing_C is not null
union all
select commodity_id as commodity_id, 80 as ord, 'shape' as name, null as low, null as high,
       '' as unit, shape as text, coalesce(source_id, 'assumption') as source_id, evidence as evidence,
       trim(coalesce('', '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'geometry' as table_name, line
  from geometry
union all
select commodity_id as commodity_id, 81 as ord, 'radius-or-half-thickness' as name, characteristic_mm as low, characteristic_mm as high,
       'mm' as unit, '' as text, coalesce(source_id, 'assumption') as source_id, evidence as evidence,
       trim(coalesce('', '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'geometry' as table_name, line
  from geometry where characteristic_mm is not null
union all
select commodity_id as commodity_id, 82 as ord, 'item-length' as name, length_mm as low, length_mm as high,
       'mm' as unit, '' as text, coalesce(source_id, 'assumption') as source_id, evidence as evidence,
       trim(coalesce('', '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'geometry' as table_name, line
  from geometry where length_mm is not null
union all
select commodity_id as commodity_id, 83 as ord, 'item-mass' as name, unit_mass_kg as low, unit_mass_kg as high,
       'kg' as unit, '' as text, coalesce(source_id, 'assumption') as source_id, evidence as evidence,
       trim(coalesce('', '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'geometry' as table_name, line
  from geometry where unit_mass_kg is not null
union all
select commodity_id as commodity_id, 84 as ord, 'item-density' as name, density_kg_m3 as low, density_kg_m3 as high,
       'kg/m3' as unit, '' as text, coalesce(source_id, 'assumption') as source_id, evidence as evidence,
       trim(coalesce('', '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'geometry' as table_name, line
  from geometry where density_kg_m3 is not null
union all
select commodity_id as commodity_id, 85 as ord, 'bulk-density' as name, bulk_density_kg_m3 as low, bulk_density_kg_m3 as high,
       'kg/m3' as unit, '' as text, coalesce(source_id, 'assumption') as source_id, evidence as evidence,
       trim(coalesce('', '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'geometry' as table_name, line
  from geometry where bulk_density_kg_m3 is not null
union all
select commodity_id as commodity_id, 90 as ord, 'stowage-density' as name, loading_density_kg_m3 as low, loading_density_kg_m3 as high,
       'kg/m3' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce(printf('printed as %g lb/ft3', loading_density_lb_ft3), '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'stowage-density' as table_name, line
  from stowage_density
union all
select commodity_id as commodity_id, 91 as ord, 'mixing-group-temperature' as name, temp_low_C as low, temp_high_C as high,
       'C' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce(group_set || ' ' || group_id, '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'mixing-groups' as table_name, line
  from mixing_groups
union all
select commodity_id as commodity_id, 92 as ord, 'mixing-group-humidity' as name, rh_low_pct as low, rh_high_pct as high,
       'pct' as unit, '' as text, source_id as source_id, evidence as evidence,
       trim(coalesce(group_set || ' ' || group_id, '') || '; ' || case when evidence_text <> evidence then evidence_text else '' end, '; ') as note,
       'mixing-groups' as table_name, line
  from mixing_groups;
