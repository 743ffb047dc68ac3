# The second program: the same quantities with lm, qt, pchisq, AIC and BIC. Called by reference.py.
# Usage: Rscript --vanilla reference.R TABLES_FOLDER OUT_FILE; writes lines case|key|value.
arguments <- commandArgs(trailingOnly = TRUE)
folder <- arguments[1]
out <- file(arguments[2], open = "wt", encoding = "UTF-8")
say <- function(case, key, value) writeLines(paste0(case, "|", key, "|", sprintf("%.17g", value)), out)

boltzmann <- 1.380649e-23
planck <- 6.62607015e-34
gas <- boltzmann * 6.02214076e23
reference <- 298.15
symbols <- list("arrhenius" = c("lnA", "Ea"), "eyring" = c("dS", "dH"), "modified-arrhenius" = c("lnA", "n", "E"))

design <- function(model, kelvin) {
  if (model == "arrhenius") cbind(1, -1 / (gas * kelvin))
  else if (model == "eyring") cbind(1 / gas, -1 / (gas * kelvin))
  else cbind(1, log(kelvin / reference), -1 / (gas * kelvin))
}

shift <- function(model, kelvin, order, standard) {
  if (model != "eyring") return(0 * kelvin)
  base <- log(boltzmann * kelvin / planck)
  if (standard == "1 mol/L") base + (1 - order) * log(1000) else base + (order - 1) * log(gas * kelvin / 1e5)
}

fit <- function(case, table, model, error, standard) {
  stated <- error == "stated"
  w <- if (stated) 1 / (table$percent / 100)^2 else rep(1, length(table$kelvin))
  x <- design(model, table$kelvin)
  y <- log(table$rate * table$factor) - shift(model, table$kelvin, table$order, standard)
  n <- nrow(x)
  p <- ncol(x)
  if (n - p < 1) return(invisible(NULL))
  scale <- sqrt(colSums(w * x^2))
  z <- sweep(x, 2, scale, "/")
  first <- if (stated) lm(y ~ 0 + z, weights = w, tol = 1e-14) else lm(y ~ 0 + z, tol = 1e-14)
  # Polish: regress the residuals once more; the correction removes what one pass in double left over.
  rest <- y - as.vector(z %*% coef(first))
  again <- if (stated) lm(rest ~ 0 + z, weights = w, tol = 1e-14) else lm(rest ~ 0 + z, tol = 1e-14)
  solution <- (coef(first) + coef(again)) / scale
  summary <- summary(first)
  rss <- sum(w * residuals(again)^2)
  variance <- if (stated) 1 else rss / (n - p)
  covariance <- variance * summary$cov.unscaled / outer(scale, scale)
  quantile <- if (stated) qnorm(0.975) else qt(0.975, n - p)
  u <- sqrt(diag(covariance))
  names <- symbols[[model]]
  for (i in seq_len(p)) {
    value <- solution[i]
    if (names[i] == "lnA") {
      value <- value - log(table$factor)
      say(case, "parameter.A", exp(value))
      say(case, "limit.A.lower", exp(value - quantile * u[i]))
      say(case, "limit.A.upper", exp(value + quantile * u[i]))
    } else {
      say(case, paste0("limit.", names[i], ".lower"), value - quantile * u[i])
      say(case, paste0("limit.", names[i], ".upper"), value + quantile * u[i])
    }
    say(case, paste0("parameter.", names[i]), value)
    say(case, paste0("uncertainty.", names[i]), u[i])
    for (j in i:p) say(case, paste0("covariance.", names[i], ".", names[j]), covariance[i, j])
  }
  if (stated) {
    say(case, "statistic.chiSquared", rss)
    say(case, "statistic.pValue", pchisq(rss, n - p, lower.tail = FALSE))
    say(case, "statistic.bic", rss + p * log(n))
    if (n > p + 1) say(case, "statistic.aicc", rss + 2 * p + 2 * p * (p + 1) / (n - p - 1))
  } else {
    count <- p + 1
    say(case, "statistic.rss", rss)
    say(case, "statistic.s", sqrt(variance))
    say(case, "statistic.bic", BIC(first))
    if (n > count + 1) say(case, "statistic.aicc", AIC(first) + 2 * count * (count + 1) / (n - count - 1))
  }
  centre <- sum(w) / sum(w / table$kelvin)
  say(case, "centre.kelvin", centre)
  if (model == "eyring") {
    say(case, "centre.dG", solution[2] - centre * solution[1])
    say(case, "centre.dG.uncertainty", sqrt(c(-centre, 1) %*% covariance %*% c(-centre, 1)))
  }
  for (text in table$targets) {
    kelvin <- as.numeric(text)
    row <- design(model, kelvin)
    mean <- shift(model, kelvin, table$order, standard) + sum(row * solution) - log(table$factor)
    uLn <- sqrt(as.vector(row %*% covariance %*% t(row)))
    key <- paste0("prediction.", text, ".")
    say(case, paste0(key, "k"), exp(mean))
    say(case, paste0(key, "uncertaintyLn"), uLn)
    say(case, paste0(key, "lower"), exp(mean - quantile * uLn))
    say(case, paste0(key, "upper"), exp(mean + quantile * uLn))
    wide <- sqrt(uLn^2 + if (stated) mean((table$percent / 100)^2) else variance)
    say(case, paste0(key, "newLower"), exp(mean - quantile * wide))
    say(case, paste0(key, "newUpper"), exp(mean + quantile * wide))
  }
}

writeLines(paste0("version||", R.version$major, ".", R.version$minor), out)
percents <- read.csv(file.path(folder, "uncertainties.csv"))
definitions <- read.csv(file.path(folder, "tables.csv"), colClasses = "character")
for (i in seq_len(nrow(definitions))) {
  d <- definitions[i, ]
  cells <- read.csv(file.path(folder, paste0(d$name, ".csv")))
  table <- list(
    kelvin = cells[[1]] + if (d$temperature_unit == "degC") 273.15 else 0,
    rate = cells[[2]],
    percent = percents$relative_standard_uncertainty_percent[percents$name == d$name],
    factor = eval(parse(text = d$rate_factor_to_si)),
    order = as.numeric(d$order),
    targets = strsplit(d$targets_K, ";")[[1]])
  for (model in names(symbols)) {
    standards <- if (model == "eyring") strsplit(d$standard, ";")[[1]] else "1 mol/L"
    for (standard in standards) {
      for (error in c("constant-relative", "stated")) {
        fit(paste(d$name, model, standard, error, sep = "/"), table, model, error, standard)
      }
    }
  }
}

expressions <- read.csv(file.path(folder, "evaluated_expressions.csv"), check.names = FALSE)
grid <- read.csv(file.path(folder, "evaluated_grid.csv"), check.names = FALSE)
for (i in seq_len(nrow(expressions))) {
  e <- expressions[i, ]
  mine <- grid[grid$reaction == e$reaction & grid$form == e$form & grid$A == e[[3]], ]
  table <- list(kelvin = mine$temperature_K, rate = mine[["k_cm3_molecule-1_s-1"]], percent = rep(1, nrow(mine)),
    factor = 602214076000000000, order = 2, targets = character(0))
  model <- if (e$form == "3-parameter") "modified-arrhenius" else "arrhenius"
  fit(paste0("grid/", i), table, model, "constant-relative", "1 mol/L")
}

ratios <- read.csv(file.path(folder, "fieller.csv"))
for (i in seq_len(nrow(ratios))) {
  r <- ratios[i, ]
  q <- if (is.na(r$degrees_of_freedom)) qnorm(0.975) else qt(0.975, r$degrees_of_freedom)
  roots <- polyroot(c(r$a^2 - q^2 * r$v11, -2 * (r$a * r$b - q^2 * r$v12), r$b^2 - q^2 * r$v22))
  case <- paste0("fieller/", r$name)
  say(case, "ratio", r$a / r$b)
  if (max(abs(Im(roots))) < 1e-6 * max(abs(roots))) {
    say(case, "limit.lower", min(Re(roots)))
    say(case, "limit.upper", max(Re(roots)))
  }
}
close(out)
