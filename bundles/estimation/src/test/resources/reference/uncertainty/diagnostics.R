# Rscript diagnostics.R > diagnostics.csv
options(digits = 16)
cat("# ", R.version.string, "; Rscript diagnostics.R > diagnostics.csv\n", sep = "")
s <- read.csv("stackloss.csv")
m <- lm(stack_loss ~ ., data = s)
for (i in 1:nrow(s)) { cat("stackloss", i - 1, format(hatvalues(m)[i], digits = 15), format(rstandard(m)[i], digits = 15),
    format(rstudent(m)[i], digits = 15), format(cooks.distance(m)[i], digits = 15), sep = ","); cat("\n") }
p <- subset(read.csv("puromycin.csv"), state == "treated"); names(p)[1:2] <- c("x", "y")
n <- nls(y ~ V * x / (K + x), p, start = list(V = 212, K = 0.064))
full <- lm(y ~ factor(x), p)
rn <- deviance(n); rf <- deviance(full); f <- ((rn - rf) / 4) / (rf / 6)
cat("lack", format(c(f, rn - rf, rf, pf(f, 4, 6, lower.tail = FALSE)), digits = 12), sep = ","); cat("\n")
a <- anova(lm(y ~ log(x), p, weights = x), lm(y ~ factor(x), p, weights = x))
cat("lack-weighted", format(c(a$F[2], a$`Sum of Sq`[2], a$RSS[2], a$`Pr(>F)`[2]), digits = 12), sep = ","); cat("\n")
